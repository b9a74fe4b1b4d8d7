import { useState } from "react";
import { Link } from "react-router";
import { paths } from "#src/lib/paths.ts";
import type { SignUpFields } from "../fields.ts";
import { AuthFrame } from "./auth-frame.tsx";
import { LetterSent } from "./letter-sent.tsx";
import { SignUpForm } from "./sign-up-form.tsx";

const nothing: SignUpFields = { name: "", email: "", newPassword: "" };

/** The form, then the word that a letter is on its way. Going back keeps what was typed. */
export function SignUp() {
  const [typed, setTyped] = useState(nothing);
  const [sent, setSent] = useState(false);
  if (sent) {
    return (
      <AuthFrame title="Look for our letter">
        <LetterSent email={typed.email} onBack={() => setSent(false)} />
      </AuthFrame>
    );
  }
  return (
    <AuthFrame title="Open an account" purpose="To keep a build of your own, or to ask about someone else's.">
      <SignUpForm
        values={typed}
        onDone={(values) => {
          setTyped(values);
          setSent(true);
        }}
      />
      <p className="border-hairline border-t pt-5">
        Have one already? <Link to={paths.signIn()}>Sign in</Link>
      </p>
    </AuthFrame>
  );
}
