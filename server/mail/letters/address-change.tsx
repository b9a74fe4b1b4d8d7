import type { LetterOf } from "#server/mail/letter.ts";
import { Act, LetterFrame, Paragraph, SmallPrint } from "./letter-frame.tsx";

/** Goes to the new address. */
export function ConfirmNewAddress({ name, newEmail, link }: LetterOf<"confirm_new_address">) {
  return (
    <LetterFrame title="Confirm your new address" preview="The change is made when you confirm it.">
      <Paragraph>Hello {name},</Paragraph>
      <Paragraph>
        You asked to change the address of your account to {newEmail}. Nothing changes until you confirm it
        here. From then on you sign in with the new address.
      </Paragraph>
      <Act href={link}>Confirm the new address</Act>
      <SmallPrint>
        The link works for 24 hours. If you did not ask for this, leave this letter alone.
      </SmallPrint>
    </LetterFrame>
  );
}

/** Goes to the old address, at the same time. */
export function AddressChangeAsked({ name, newEmail, link }: LetterOf<"address_change_asked">) {
  return (
    <LetterFrame title="Your address is to be changed" preview="Was this you?">
      <Paragraph>Hello {name},</Paragraph>
      <Paragraph>
        Someone who knows your password asked to change the address of your account to {newEmail}. It changes
        once that address has been confirmed. If this was you, there is nothing to do here.
      </Paragraph>
      <Paragraph>If it was not you, set a new password now: that also stops the change.</Paragraph>
      <Act href={link}>Set a new password</Act>
    </LetterFrame>
  );
}
