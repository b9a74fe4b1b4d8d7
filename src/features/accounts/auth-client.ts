import { createAuthClient } from "better-auth/client";
import { authErrorFrom } from "./auth-errors.ts";

/** What better-auth's client answers with; it never throws for a refusal. */
interface AuthAnswer {
  error: { status: number; code?: string; message?: string } | null;
}

let made: ReturnType<typeof createAuthClient> | null = null;

/** Made on first use, as pages are drawn on the server too. */
function client() {
  made ??= createAuthClient({ fetchOptions: { throw: false } });
  return made;
}

async function settle(call: Promise<AuthAnswer>): Promise<void> {
  let answer: AuthAnswer;
  try {
    answer = await call;
  } catch {
    throw authErrorFrom({ status: 0 });
  }
  if (answer.error) throw authErrorFrom(answer.error);
}

export function signIn(values: { email: string; password: string }): Promise<void> {
  return settle(client().signIn.email(values));
}

export function signUp(values: { name: string; email: string; password: string }): Promise<void> {
  return settle(client().signUp.email(values));
}

/** Sends the letter that confirms an address; done or not, the answer is the same for strangers. */
export function sendVerification(email: string): Promise<void> {
  return settle(client().sendVerificationEmail({ email }));
}

export function requestPasswordReset(email: string): Promise<void> {
  return settle(client().requestPasswordReset({ email }));
}

export function resetPassword(values: { token: string; newPassword: string }): Promise<void> {
  return settle(client().resetPassword(values));
}

export function changePassword(values: { currentPassword: string; newPassword: string }): Promise<void> {
  return settle(client().changePassword(values));
}

/** The password goes along, which the library's own call has no place for. */
export function changeEmail(body: { newEmail: string; password: string }): Promise<void> {
  return settle(client().$fetch("/change-email", { method: "POST", body }));
}
