import { useMutation } from "@tanstack/react-query";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { sendVerification } from "#src/features/accounts/auth-client.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useViewer } from "#src/lib/viewer.ts";

/** Says that the e-mail address comes first, and sends the letter again. */
export function ConfirmAddress({ before }: { before: string }) {
  const hydrated = useHydrated();
  const viewer = useViewer();
  const resend = useMutation({ mutationFn: sendVerification });
  if (!viewer) return null;
  return (
    <div className="flex max-w-measure flex-col gap-3">
      <Notice
        kind="attention"
        title="Confirm your address first"
        actions={
          <Button
            disabled={!hydrated}
            busy={resend.isPending}
            busyLabel="Sending the letter…"
            onClick={() => resend.mutate(viewer.email)}
          >
            Send the letter again
          </Button>
        }
      >
        We sent a letter to {viewer.email}. Open the link in it, then you can {before}.
      </Notice>
      {resend.isSuccess ? (
        <Notice kind="success" role="status">
          A new letter is on its way to {viewer.email}.
        </Notice>
      ) : null}
      {resend.error ? (
        <Notice kind="error" role="alert">
          {resend.error.message}
        </Notice>
      ) : null}
    </div>
  );
}
