import X from "lucide-react/icons/x";
import { Dialog as Radix } from "radix-ui";
import { type ReactNode, useRef } from "react";

type DialogProps = {
  title: string;
  /** Said under the title and read out when the dialog opens. */
  description?: ReactNode;
  /** The control that opens it; leave out when `open` is governed from outside. */
  trigger?: ReactNode;
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  children: ReactNode;
  actions?: ReactNode;
};

/**
 * App pages only (Radix): never import from a public reading page. Comes up from the bottom edge on a phone. The focus
 * begins on what carries `data-focus-first`, and goes back to where it was.
 */
export function Dialog({ title, description, trigger, open, onOpenChange, children, actions }: DialogProps) {
  const before = useRef<Element | null>(null);
  const begin = (event: Event) => {
    before.current = document.activeElement;
    const first = (event.target as HTMLElement).querySelector<HTMLElement>("[data-focus-first]");
    if (!first) return;
    event.preventDefault();
    first.focus();
  };
  // Radix gives the focus back to its own trigger alone; without one it would be lost.
  const end = (event: Event) => {
    if (trigger || !(before.current instanceof HTMLElement)) return;
    event.preventDefault();
    before.current.focus();
  };
  return (
    <Radix.Root {...(open === undefined ? {} : { open })} onOpenChange={onOpenChange}>
      {trigger ? <Radix.Trigger asChild>{trigger}</Radix.Trigger> : null}
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-[#0b1014]/60" />
        <Radix.Content
          onOpenAutoFocus={begin}
          onCloseAutoFocus={end}
          {...(description ? {} : { "aria-describedby": undefined })}
          className="fixed inset-x-0 bottom-0 z-50 flex max-h-[90dvh] flex-col rounded-t border border-edge bg-paper-raised text-ink shadow-lifted sm:inset-x-auto sm:top-1/2 sm:bottom-auto sm:left-1/2 sm:w-[min(34rem,calc(100vw-2rem))] sm:-translate-1/2 sm:rounded"
        >
          <div className="flex items-start justify-between gap-4 border-b border-hairline py-2 pr-2 pl-5">
            <Radix.Title className="py-2 text-lg leading-tight">{title}</Radix.Title>
            <Radix.Close className="grid size-11 shrink-0 cursor-pointer place-content-center rounded hover:bg-grey-wash">
              <X aria-hidden="true" className="size-5" />
              <span className="sr-only">Close</span>
            </Radix.Close>
          </div>
          <div className="flex flex-col gap-4 overflow-y-auto px-5 py-4">
            {description ? (
              <Radix.Description asChild>
                <div className="text-ink-soft">{description}</div>
              </Radix.Description>
            ) : null}
            {children}
          </div>
          {actions ? (
            <div className="flex flex-wrap gap-2 border-t border-hairline px-5 py-3 max-sm:flex-col max-sm:[&>*]:w-full sm:justify-end">
              {actions}
            </div>
          ) : null}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
