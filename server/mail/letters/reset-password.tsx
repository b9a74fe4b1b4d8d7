import type { LetterOf } from "#server/mail/letter.ts";
import { Act, LetterFrame, Paragraph, SmallPrint } from "./letter-frame.tsx";

export function ResetPassword({ name, link }: LetterOf<"reset_password">) {
  return (
    <LetterFrame title="Set a new password" preview="The link works once, for one hour.">
      <Paragraph>Hello {name},</Paragraph>
      <Paragraph>
        Here is the link to set a new password. It works once, for one hour. Setting the password signs you
        out on every device.
      </Paragraph>
      <Act href={link}>Set a new password</Act>
      <SmallPrint>
        If you did not ask for this, leave this letter alone: your password stays as it is.
      </SmallPrint>
    </LetterFrame>
  );
}
