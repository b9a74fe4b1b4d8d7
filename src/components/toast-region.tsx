import { useSyncExternalStore } from "react";
import { Mark } from "./mark.tsx";
import { toasts as pageToasts, type Toast, type ToastStore } from "./toast-store.ts";

const nothing: Toast[] = [];

/** Put once in the layout. The region is always there, so that a screen reader hears what arrives. */
export function ToastRegion({ store = pageToasts }: { store?: ToastStore }) {
  const shown = useSyncExternalStore(store.subscribe, store.current, () => nothing);
  return (
    <section
      aria-label="Messages"
      aria-live="polite"
      className="pointer-events-none fixed inset-x-4 bottom-4 z-50 flex flex-col items-end gap-2 sm:left-auto sm:w-96"
      data-chrome
    >
      {shown.map((toast) => (
        <div
          key={toast.id}
          className="plate pointer-events-auto flex w-full items-center gap-3 py-1 pr-1 pl-4 text-sm shadow-lifted"
        >
          <Mark
            shape={toast.kind === "error" ? "cross" : "stroke"}
            className={toast.kind === "error" ? "size-4 text-signal" : "size-4 text-temper"}
          />
          <p className="min-w-0 flex-1 py-2">{toast.message}</p>
          {toast.undo ? (
            <ToastButton
              onClick={() => {
                toast.undo?.run();
                store.dismiss(toast.id);
              }}
            >
              {toast.undo.label}
            </ToastButton>
          ) : null}
          <ToastButton onClick={() => store.dismiss(toast.id)}>Dismiss</ToastButton>
        </div>
      ))}
    </section>
  );
}

function ToastButton({ onClick, children }: { onClick: () => void; children: string }) {
  return (
    <button
      type="button"
      onClick={onClick}
      className="min-h-11 cursor-pointer rounded px-3 font-semibold text-temper hover:bg-paper-raised"
    >
      {children}
    </button>
  );
}
