import { useState } from "react";
import { buttonClass } from "#src/components/button-class.ts";
import { LinkButton } from "#src/components/link-button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { paths } from "#src/lib/paths.ts";
import { useViewer } from "#src/lib/viewer.ts";
import { sendVerification } from "../auth-client.ts";
import { AuthFrame } from "./auth-frame.tsx";
import { EmailForm } from "./email-form.tsx";
import { MailFakeHint } from "./letter-sent.tsx";

interface VerifyEmailProps {
  token: string | null;
  /** Set when the server has confirmed the address and led back here. */
  confirmed: boolean;
  /** The server's reason for not confirming it. */
  error: string | null;
}

/** Where the link in the letter leads. */
export function VerifyEmail({ token, confirmed, error }: VerifyEmailProps) {
  if (error) return <NotConfirmed />;
  if (confirmed) return <Confirmed />;
  return token ? <ToConfirm token={token} /> : <NotConfirmed />;
}

/** A press, not the mere opening of the link, confirms: mail programs open links on their own. Works without JavaScript. */
function ToConfirm({ token }: { token: string }) {
  return (
    <div className="page-width py-10">
      <title>Confirm your address · Soapstone</title>
      <meta name="robots" content="noindex" />
      <h1>Confirm your address</h1>
      <p className="mt-3 max-w-measure font-serif text-base text-ink-soft">
        One press, and this e-mail address is yours here.
      </p>
      <form method="get" action="/api/auth/verify-email" className="mt-8">
        <input type="hidden" name="token" value={token} />
        <input type="hidden" name="callbackURL" value={`${paths.verifyEmail()}?confirmed=1`} />
        <button type="submit" className={buttonClass("primary")}>
          Confirm this address
        </button>
      </form>
    </div>
  );
}

function Confirmed() {
  const viewer = useViewer();
  return (
    <AuthFrame title="Your address is confirmed" purpose="You can publish now.">
      <div>
        {viewer ? (
          <LinkButton to={paths.workshop()} tone="primary">
            Go to the workshop
          </LinkButton>
        ) : (
          <LinkButton to={paths.signIn(paths.workshop())} tone="primary">
            Sign in
          </LinkButton>
        )}
      </div>
    </AuthFrame>
  );
}

function NotConfirmed() {
  const [sentTo, setSentTo] = useState<string | null>(null);
  return (
    <AuthFrame title="This link does not work" purpose="It has run out, was used already, or is not whole.">
      {sentTo ? (
        <>
          <Notice kind="success" title="On its way" role="status">
            If <span className="break-all">{sentTo}</span> waits to be confirmed, a new letter is going there.
          </Notice>
          <MailFakeHint />
        </>
      ) : (
        <p>
          If your address is not confirmed yet, have a new letter sent. To change an address, ask again on
          your account page.
        </p>
      )}
      <EmailForm action="Send a new letter" send={sendVerification} onSent={setSentTo} />
    </AuthFrame>
  );
}
