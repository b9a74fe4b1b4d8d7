import type { BetterAuthOptions } from "better-auth";
import type { Database } from "#server/db/client.ts";
import type { Letter } from "#server/mail/letter.ts";
import { passwordLimits } from "#shared/contracts/sessions.ts";
import { findUser } from "./repository.ts";

interface AuthLettersParts {
  siteUrl: string;
  database: Database;
  sendLetter: (to: string, letter: Letter) => void;
}

/** When better-auth has a letter written. All go through the queue, so that no answer's speed tells who has an account. */
export function authLetters({ siteUrl, database, sendLetter }: AuthLettersParts) {
  const link = (path: string, token?: string) =>
    `${siteUrl}${path}${token ? `?token=${encodeURIComponent(token)}` : ""}`;

  return {
    emailAndPassword: {
      enabled: true,
      minPasswordLength: passwordLimits.least,
      maxPasswordLength: passwordLimits.most,
      // Without a session after sign-up, a taken address can be answered like a new one.
      autoSignIn: false,
      requireEmailVerification: false,
      revokeSessionsOnPasswordReset: true,
      resetPasswordTokenExpiresIn: 3600,
      customSyntheticUser: ({ coreFields, id }) => ({
        ...coreFields,
        handle: "",
        role: "reader",
        units: "mm",
        id,
      }),
      async onExistingUserSignUp({ user }) {
        const links = { link: link("/sign-in"), resetLink: link("/forgot-password") };
        sendLetter(user.email, { kind: "account_exists", name: user.name, ...links });
      },
      async sendResetPassword({ user, token }) {
        sendLetter(user.email, {
          kind: "reset_password",
          name: user.name,
          link: link("/reset-password", token),
        });
      },
    },
    emailVerification: {
      sendOnSignUp: true,
      expiresIn: 24 * 3600,
      async sendVerificationEmail({ user, token }) {
        const confirm = { name: user.name, link: link("/verify-email", token) };
        const present = findUser(database, user.id)?.email;
        if (!present || present === user.email) {
          sendLetter(user.email, { kind: "verify_address", ...confirm });
          return;
        }
        sendLetter(user.email, { kind: "confirm_new_address", ...confirm, newEmail: user.email });
        const warn = { name: user.name, newEmail: user.email, link: link("/forgot-password") };
        sendLetter(present, { kind: "address_change_asked", ...warn });
      },
    },
  } satisfies Pick<BetterAuthOptions, "emailAndPassword" | "emailVerification">;
}
