import { type PhotoView, photoLimits } from "#shared/contracts/photos.ts";
import { ApiError } from "#src/lib/api.ts";

export type UploadState =
  | { kind: "waiting" }
  | { kind: "sending"; share: number }
  | { kind: "failed"; message: string; canRetry: boolean };

/** One photo on its way to the server. */
export interface Upload {
  id: string;
  /** Where it will stand once it is there. */
  place: string;
  name: string;
  state: UploadState;
}

type Send = (file: File, onProgress: (share: number) => void, signal: AbortSignal) => Promise<PhotoView>;

interface UploadQueuePorts {
  send: Send;
  newId(): string;
  /** Told when a photo is on the server; its pictures may still be in the making. */
  onDone(upload: Upload, photo: PhotoView): void;
}

const atOnce = 2;

/** Sends photos two at a time and holds what became of each, until it is done, cancelled or tried again. */
export class UploadQueue {
  #uploads: readonly Upload[] = [];
  #files = new Map<string, File>();
  #running = new Map<string, AbortController>();
  #listeners = new Set<() => void>();

  constructor(private readonly ports: UploadQueuePorts) {}

  subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  uploads = (): readonly Upload[] => this.#uploads;

  add(files: readonly File[], place: string): void {
    for (const file of files) {
      const id = this.ports.newId();
      this.#files.set(id, file);
      this.#set([...this.#uploads, { id, place, name: file.name, state: stateBeforeSending(file) }]);
    }
    this.#fill();
  }

  retry(id: string): void {
    this.#update(id, { kind: "waiting" });
    this.#fill();
  }

  /** Stops an upload, or takes a failed one off the list. */
  cancel(id: string): void {
    this.#running.get(id)?.abort();
    this.#drop(id);
    this.#fill();
  }

  cancelAll(): void {
    for (const { id } of this.#uploads) this.cancel(id);
  }

  #fill(): void {
    for (const upload of this.#uploads) {
      if (this.#running.size >= atOnce) return;
      if (upload.state.kind === "waiting" && !this.#running.has(upload.id)) void this.#send(upload);
    }
  }

  async #send(upload: Upload): Promise<void> {
    const file = this.#files.get(upload.id);
    if (!file) return;
    const controller = new AbortController();
    this.#running.set(upload.id, controller);
    this.#update(upload.id, { kind: "sending", share: 0 });
    try {
      const onProgress = (share: number) => this.#update(upload.id, { kind: "sending", share });
      const photo = await this.ports.send(file, onProgress, controller.signal);
      if (controller.signal.aborted) return;
      this.#drop(upload.id);
      this.ports.onDone(upload, photo);
    } catch (error) {
      if (!controller.signal.aborted) this.#update(upload.id, failureOf(error));
    } finally {
      this.#running.delete(upload.id);
      this.#fill();
    }
  }

  #drop(id: string): void {
    this.#files.delete(id);
    this.#set(this.#uploads.filter((upload) => upload.id !== id));
  }

  #update(id: string, state: UploadState): void {
    this.#set(this.#uploads.map((upload) => (upload.id === id ? { ...upload, state } : upload)));
  }

  #set(uploads: readonly Upload[]): void {
    this.#uploads = uploads;
    for (const listener of this.#listeners) listener();
  }
}

/** What can be told without the server is told at once; what a file truly is, only the server finds out. */
function stateBeforeSending(file: File): UploadState {
  const most = photoLimits.bytes / 1024 / 1024;
  const size = (file.size / 1024 / 1024).toFixed(1);
  if (file.size <= photoLimits.bytes) return { kind: "waiting" };
  const message = `This photo is ${size} MB. The most a photo may have is ${most} MB.`;
  return { kind: "failed", message, canRetry: false };
}

function failureOf(error: unknown): UploadState {
  if (!(error instanceof ApiError)) {
    return { kind: "failed", message: "The photo could not be sent.", canRetry: true };
  }
  const canRetry = error.status === 0 || error.status === 429 || error.status >= 500;
  return { kind: "failed", message: Object.values(error.fields)[0] ?? error.message, canRetry };
}
