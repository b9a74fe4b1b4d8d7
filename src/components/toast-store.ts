export type Toast = {
  id: number;
  message: string;
  kind: "success" | "error";
  undo?: { label: string; run: () => void };
};

type Listener = () => void;

const shownFor = 8_000;
const none: Toast[] = [];

/** Messages that pass. Errors and anything that can be undone stay until they are answered. */
export class ToastStore {
  #toasts: Toast[] = none;
  #listeners = new Set<Listener>();
  #next = 1;

  subscribe = (listener: Listener): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  current = (): Toast[] => this.#toasts;

  show(toast: Omit<Toast, "id">): number {
    const id = this.#next++;
    this.#set([...this.#toasts, { ...toast, id }]);
    if (toast.kind === "success" && !toast.undo) setTimeout(() => this.dismiss(id), shownFor);
    return id;
  }

  dismiss(id: number): void {
    this.#set(this.#toasts.filter((toast) => toast.id !== id));
  }

  #set(toasts: Toast[]): void {
    this.#toasts = toasts;
    for (const listener of this.#listeners) listener();
  }
}

/** The browser's one store; nothing is shown from the server. */
export const toasts = new ToastStore();
