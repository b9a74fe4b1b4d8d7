import { z } from "zod";
import { displayName } from "#shared/contracts/people.ts";
import { passwordLimits } from "#shared/contracts/sessions.ts";

export const emailField = z
  .string()
  .trim()
  .min(1, "The e-mail address is missing.")
  .pipe(z.email("That does not look like an e-mail address."));

/** A password that is being chosen. */
export const newPasswordField = z
  .string()
  .min(passwordLimits.least, `Use at least ${passwordLimits.least} characters.`)
  .max(passwordLimits.most, `Use at most ${passwordLimits.most} characters.`);

/** A password that is being given. */
export const passwordField = z.string().min(1, "The password is missing.");

export const signInFields = z.object({ email: emailField, password: passwordField });
export const signUpFields = z.object({ name: displayName, email: emailField, newPassword: newPasswordField });
export const changeEmailFields = z.object({ newEmail: emailField, password: passwordField });
export const changePasswordFields = z.object({ password: passwordField, newPassword: newPasswordField });

export type SignInFields = z.infer<typeof signInFields>;
export type SignUpFields = z.infer<typeof signUpFields>;
export type ChangeEmailFields = z.infer<typeof changeEmailFields>;
export type ChangePasswordFields = z.infer<typeof changePasswordFields>;
