import { ApiError } from "#src/lib/api.ts";

interface AuthFault {
  status: number;
  code?: string;
  message?: string;
}

/** What to say for each refusal of the auth routes, and beside which field. */
const words: Record<string, { message: string; field?: string }> = {
  INVALID_EMAIL_OR_PASSWORD: { message: "The address or the password is wrong." },
  INVALID_EMAIL: { message: "That does not look like an e-mail address.", field: "email" },
  INVALID_PASSWORD: { message: "That is not your password.", field: "password" },
  PASSWORD_TOO_SHORT: { message: "Use at least 10 characters.", field: "newPassword" },
  PASSWORD_TOO_LONG: { message: "Use at most 128 characters.", field: "newPassword" },
  INVALID_TOKEN: { message: "This link has run out or was used already." },
  TOKEN_EXPIRED: { message: "This link has run out." },
  EMAIL_ALREADY_VERIFIED: { message: "This address is confirmed already." },
  INVALID_ORIGIN: {
    message: "Nobody can sign in from this address. Open the site at the address it is set up for.",
  },
};

const codes: Record<number, ApiError["code"]> = {
  0: "offline",
  401: "not_signed_in",
  403: "not_allowed",
  429: "rate_limited",
};

/** A refusal of the auth routes in the form that all other refusals have. */
export function authErrorFrom({ status, code = "", message }: AuthFault): ApiError {
  if (status === 0) {
    return new ApiError(0, "offline", "The server cannot be reached. Check the connection and try again.");
  }
  if (status === 429) {
    return new ApiError(429, "rate_limited", "Too many tries. Wait a minute, then try again.");
  }
  const known = words[code] ?? (code === "INVALID_NAME" ? { message, field: "name" } : undefined);
  const text = known?.message ?? "That did not work. Nothing you typed is lost: try again.";
  return new ApiError(
    status,
    codes[status] ?? "invalid_input",
    text,
    known?.field ? { [known.field]: text } : {},
  );
}
