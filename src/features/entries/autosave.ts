import { ApiError } from "#src/lib/api.ts";
import { type DraftBase, type DraftContent, sameContent } from "./draft-content.ts";

/** Where what was typed is now, in a form the page can put into words. */
export type SaveState =
  | { kind: "saved"; at: number }
  | { kind: "waiting" }
  | { kind: "saving" }
  /** The server was not reached: the words are on this device, and it tries again at `retryAt`. */
  | { kind: "kept"; message: string; retryAt: number }
  /** The server will not take it as it is: the words are on this device until they are mended. */
  | { kind: "refused"; message: string; fields: Record<string, string> }
  | { kind: "conflict" };

interface AutosavePorts {
  /** Sends the content to the server; answers the version it became and when. */
  send(content: DraftContent, baseVersion: number): Promise<{ version: number; updatedAt: number }>;
  /** Keeps what the server does not have yet in the browser; null forgets it. */
  keep(unsaved: { base: DraftBase; content: DraftContent } | null): void;
  now(): number;
}

const quiet = 1000;
const longestWait = 8000;
const firstRetry = 2000;
const longestRetry = 60_000;

/**
 * Saves a draft as it is written: a second after the last change, at most eight after the first. One request is under
 * way at a time. What fails for want of a connection is tried again, ever more slowly; what is refused waits for a change.
 */
export class Autosave {
  #base: DraftBase;
  #content: DraftContent;
  #state: SaveState;
  #listeners = new Set<() => void>();
  #timer: ReturnType<typeof setTimeout> | undefined;
  #dirtySince: number | null = null;
  #underWay: Promise<void> | null = null;
  #retries = 0;
  #stopped = false;

  constructor(
    private readonly ports: AutosavePorts,
    base: DraftBase,
    savedAt: number,
  ) {
    this.#base = base;
    this.#content = base.content;
    this.#state = { kind: "saved", at: savedAt };
  }

  subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  state = (): SaveState => this.#state;

  get base(): DraftBase {
    return this.#base;
  }

  get content(): DraftContent {
    return this.#content;
  }

  /** Whether the server has not got everything that was typed. */
  get dirty(): boolean {
    return !sameContent(this.#content, this.#base.content);
  }

  change(content: DraftContent): void {
    this.#content = content;
    if (!this.dirty && !this.#underWay) {
      this.#settle(this.#state.kind === "saved" ? this.#state.at : this.ports.now());
      return;
    }
    this.ports.keep({ base: this.#base, content });
    if (this.#state.kind === "conflict") return;
    this.#dirtySince ??= this.ports.now();
    this.#retries = 0;
    if (!this.#underWay) {
      this.#show({ kind: "waiting" });
      this.#sendIn(Math.min(quiet, this.#dirtySince + longestWait - this.ports.now()));
    }
  }

  /** Saves at once what is not saved yet; resolves when no request is under way any more. */
  async flush(): Promise<void> {
    while (this.#underWay) await this.#underWay;
    if (this.dirty && this.#state.kind !== "conflict" && !this.#stopped) await this.#send();
  }

  /** Starts afresh from another version of the server: after a merge, a restored revision, or news of another tab. */
  rebase(base: DraftBase, content: DraftContent, savedAt: number): void {
    this.#base = base;
    this.#dirtySince = null;
    this.#show({ kind: "saved", at: savedAt });
    this.change(content);
  }

  /** The server's version rose without the words changing, as on publishing. */
  accept(version: number): void {
    this.#base = { ...this.#base, version };
  }

  /** Ends the timers; what is under way is still answered. `resume` takes it up again. */
  stop(): void {
    this.#stopped = true;
    clearTimeout(this.#timer);
  }

  resume(): void {
    this.#stopped = false;
    if (this.dirty) this.change(this.#content);
  }

  #sendIn(delay: number): void {
    clearTimeout(this.#timer);
    if (!this.#stopped) this.#timer = setTimeout(() => void this.#send(), Math.max(0, delay));
  }

  async #send(): Promise<void> {
    clearTimeout(this.#timer);
    if (this.#underWay || this.#stopped) return;
    this.#show({ kind: "saving" });
    this.#underWay = this.#attempt();
    await this.#underWay;
    this.#underWay = null;
    if (this.#state.kind === "saved" && this.dirty) this.change(this.#content);
  }

  async #attempt(): Promise<void> {
    const content = this.#content;
    this.#dirtySince = null;
    try {
      const { version, updatedAt } = await this.ports.send(content, this.#base.version);
      this.#base = { version, content };
      this.#retries = 0;
      this.#settle(updatedAt);
    } catch (error) {
      this.#fail(error);
    }
  }

  #settle(at: number): void {
    clearTimeout(this.#timer);
    this.#dirtySince = null;
    if (!this.dirty) this.ports.keep(null);
    this.#show({ kind: "saved", at });
  }

  #fail(error: unknown): void {
    const message = error instanceof Error ? error.message : "The entry could not be saved.";
    if (error instanceof ApiError && error.code === "draft_conflict") {
      this.#show({ kind: "conflict" });
    } else if (error instanceof ApiError && !mayPass(error)) {
      this.#show({ kind: "refused", message, fields: error.fields });
    } else {
      const delay = Math.min(firstRetry * 2 ** this.#retries, longestRetry);
      this.#retries += 1;
      this.#show({ kind: "kept", message, retryAt: this.ports.now() + delay });
      this.#sendIn(delay);
    }
  }

  #show(state: SaveState): void {
    this.#state = state;
    for (const listener of this.#listeners) listener();
  }
}

/** Whether the same request may be taken later: a lost connection, a fault of the server's, too many at a time. */
function mayPass(error: ApiError): boolean {
  return error.status === 0 || error.status >= 500 || error.code === "rate_limited";
}
