import { toasts } from "#src/components/toast-store.ts";

let shown: number | null = null;

/** Says what was done, with the way back. A later offer takes the place of the one before. */
export function offerUndo(message: string, run: () => void): void {
  if (shown !== null) toasts.dismiss(shown);
  shown = toasts.show({ message, kind: "success", undo: { label: "Undo", run } });
}
