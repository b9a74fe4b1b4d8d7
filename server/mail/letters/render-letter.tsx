import { render, toPlainText } from "@react-email/render";
import type { ReactElement } from "react";
import type { Letter } from "#server/mail/letter.ts";
import { AccountExists } from "./account-exists.tsx";
import { AddressChangeAsked, ConfirmNewAddress } from "./address-change.tsx";
import { ResetPassword } from "./reset-password.tsx";
import { VerifyAddress } from "./verify-address.tsx";

function written(letter: Letter): { subject: string; body: ReactElement } {
  switch (letter.kind) {
    case "verify_address":
      return { subject: "Confirm your address", body: <VerifyAddress {...letter} /> };
    case "account_exists":
      return { subject: "You already have an account", body: <AccountExists {...letter} /> };
    case "reset_password":
      return { subject: "Set a new password", body: <ResetPassword {...letter} /> };
    case "confirm_new_address":
      return { subject: "Confirm your new address", body: <ConfirmNewAddress {...letter} /> };
    case "address_change_asked":
      return { subject: "Your address is to be changed", body: <AddressChangeAsked {...letter} /> };
  }
}

/** A letter as it is sent: the subject, and the body twice. */
export async function renderLetter(letter: Letter): Promise<{ subject: string; html: string; text: string }> {
  const { subject, body } = written(letter);
  const html = await render(body);
  const text = toPlainText(html, {
    selectors: [
      { selector: "[data-skip-in-text=true]", format: "skip" },
      { selector: "h1", options: { uppercase: false } },
      { selector: "a", options: { hideLinkHrefIfSameAsText: true } },
    ],
  });
  return { subject: `Soapstone: ${subject}`, html, text };
}
