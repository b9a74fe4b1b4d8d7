import type { LetterOf } from "#server/mail/letter.ts";
import { Act, LetterFrame, Paragraph } from "./letter-frame.tsx";

/** For the owner of an address that someone tried to open a second account with. */
export function AccountExists({ name, link, resetLink }: LetterOf<"account_exists">) {
  return (
    <LetterFrame title="You already have an account" preview="Someone tried to sign up with your address.">
      <Paragraph>Hello {name},</Paragraph>
      <Paragraph>
        Someone tried to open a new account with this address. You have one already, so nothing was changed.
        If it was you, sign in as usual.
      </Paragraph>
      <Act href={link}>Sign in</Act>
      <Paragraph>If you forgot the password, set a new one.</Paragraph>
      <Act href={resetLink}>Set a new password</Act>
    </LetterFrame>
  );
}
