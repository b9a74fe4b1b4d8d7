import type { LetterOf } from "#server/mail/letter.ts";
import { Act, LetterFrame, Paragraph, SmallPrint } from "./letter-frame.tsx";

export function VerifyAddress({ name, link }: LetterOf<"verify_address">) {
  return (
    <LetterFrame title="Confirm your address" preview="One press, and you can publish.">
      <Paragraph>Hello {name},</Paragraph>
      <Paragraph>
        Someone, we hope you, opened an account with this address. Confirm it, so that you can publish a build
        and get back in should you forget your password.
      </Paragraph>
      <Act href={link}>Confirm this address</Act>
      <SmallPrint>
        The link works for 24 hours. If you did not open an account, leave this letter alone: without the
        confirmation nothing can be published in your name.
      </SmallPrint>
    </LetterFrame>
  );
}
