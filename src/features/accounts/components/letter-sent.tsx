import { useMutation } from "@tanstack/react-query";
import { useEffect, useRef } from "react";
import { Button } from "#src/components/button.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { usePageSettings } from "#src/lib/page-settings.ts";
import { paths } from "#src/lib/paths.ts";
import { sendVerification } from "../auth-client.ts";
import { FormNotice } from "./form-notice.tsx";

/** After signing up: where the letter went, and what to do when it does not come. */
export function LetterSent({ email, onBack }: { email: string; onBack: () => void }) {
  const resend = useMutation({ mutationFn: sendVerification });
  const top = useRef<HTMLParagraphElement>(null);
  useEffect(() => top.current?.focus(), []);
  return (
    <>
      <p ref={top} tabIndex={-1} className="font-serif text-base outline-none">
        We sent a letter to <strong className="break-all">{email}</strong>. Open the link in it to confirm the
        address. You can sign in before that; to publish, the address must be confirmed.
      </p>
      <MailFakeHint />
      {resend.isSuccess ? (
        <Notice kind="success" role="status">
          Another letter is on its way.
        </Notice>
      ) : null}
      <FormNotice message={resend.error?.message} />
      <div className="flex flex-wrap gap-2">
        <LinkButton to={paths.signIn()} tone="primary">
          Sign in
        </LinkButton>
        <Button busy={resend.isPending} busyLabel="Sending…" onClick={() => resend.mutate(email)}>
          Send the letter again
        </Button>
        <Button tone="quiet" onClick={onBack}>
          Use another address
        </Button>
      </div>
    </>
  );
}

/** While letters stop at the mail fake, nothing will come to a real mailbox: say where to look. */
export function MailFakeHint() {
  const { fakes } = usePageSettings();
  if (!fakes) return null;
  return (
    <Notice kind="information" title="Letters stay here">
      No mail server is set up, so the letter lies in <a href={paths.mailFake()}>the mail fake</a>.
    </Notice>
  );
}
