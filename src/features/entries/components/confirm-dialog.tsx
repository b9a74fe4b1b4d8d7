import { type ReactNode, useState } from "react";
import { Button } from "#src/components/button.tsx";
import { Dialog } from "#src/components/dialog.tsx";

interface ConfirmDialogProps {
  title: string;
  /** What the button says: the act itself. */
  action: string;
  children: ReactNode;
  onConfirm(): Promise<unknown>;
  onClose(): void;
}

/** Asks once more before something is taken from readers or deleted. */
export function ConfirmDialog({ title, action, children, onConfirm, onClose }: ConfirmDialogProps) {
  const [busy, setBusy] = useState(false);
  const confirm = async () => {
    setBusy(true);
    await onConfirm();
    onClose();
  };
  return (
    <Dialog
      open
      onOpenChange={(stays) => !stays && onClose()}
      title={title}
      description={children}
      actions={
        <>
          <Button onClick={onClose}>Leave it as it is</Button>
          <Button tone="destructive" busy={busy} onClick={() => void confirm()}>
            {action}
          </Button>
        </>
      }
    >
      {null}
    </Dialog>
  );
}
