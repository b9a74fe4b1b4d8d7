type Message = { tab: string } & ({ kind: "hello" | "here" | "bye" } | { kind: "saved"; version: number });

interface ChannelPorts {
  /** The other tabs of this browser that have the same draft open. */
  onTabs(tabs: ReadonlySet<string>): void;
  /** Another tab has saved this version. */
  onSaved(version: number): void;
}

/** Talk between the tabs of one browser that have the same draft open. */
export class DraftChannel {
  #channel: BroadcastChannel;
  #tabs = new Set<string>();

  constructor(
    entryId: string,
    private readonly tab: string,
    private readonly ports: ChannelPorts,
  ) {
    this.#channel = new BroadcastChannel(`soapstone-draft-${entryId}`);
    this.#channel.onmessage = ({ data }: MessageEvent<Message>) => this.#hear(data);
    this.arrive();
  }

  announceSaved(version: number): void {
    this.#say({ kind: "saved", version });
  }

  /** Says that this tab has the draft open; the others answer. */
  arrive(): void {
    this.#say({ kind: "hello" });
  }

  /** Says that this tab is going; a page that is closed gets no other chance to. */
  leave(): void {
    this.#say({ kind: "bye" });
  }

  close(): void {
    this.leave();
    this.#channel.close();
  }

  #hear(message: Message): void {
    if (message.kind === "saved") {
      this.ports.onSaved(message.version);
      return;
    }
    if (message.kind === "hello") this.#say({ kind: "here" });
    if (message.kind === "bye") this.#tabs.delete(message.tab);
    else this.#tabs.add(message.tab);
    this.ports.onTabs(new Set(this.#tabs));
  }

  #say(message: { kind: "hello" | "here" | "bye" } | { kind: "saved"; version: number }): void {
    this.#channel.postMessage({ ...message, tab: this.tab });
  }
}
