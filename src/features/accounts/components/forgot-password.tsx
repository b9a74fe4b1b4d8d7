import { useState } from "react";
import { Link } from "react-router";
import { Notice } from "#src/components/notice.tsx";
import { paths } from "#src/lib/paths.ts";
import { requestPasswordReset } from "../auth-client.ts";
import { AuthFrame } from "./auth-frame.tsx";
import { EmailForm } from "./email-form.tsx";
import { MailFakeHint } from "./letter-sent.tsx";

export function ForgotPassword() {
  const [sentTo, setSentTo] = useState<string | null>(null);
  return (
    <AuthFrame
      title="Forgot the password"
      purpose="Give the address of your account. A letter with a link to set a new password goes there."
    >
      {sentTo ? (
        <>
          <Notice kind="success" title="On its way" role="status">
            If <span className="break-all">{sentTo}</span> has an account here, a letter is going there. The
            link in it works once, for one hour.
          </Notice>
          <MailFakeHint />
        </>
      ) : null}
      <EmailForm
        action={sentTo ? "Send the letter again" : "Send the letter"}
        send={requestPasswordReset}
        onSent={setSentTo}
      />
      <p className="border-hairline border-t pt-5">
        It came back to you? <Link to={paths.signIn()}>Sign in</Link>
      </p>
    </AuthFrame>
  );
}
