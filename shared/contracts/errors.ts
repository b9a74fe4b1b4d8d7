import { z } from "zod";

/** Every way the API can refuse, and the HTTP status each is sent with. */
export const errorStatus = {
  invalid_input: 422,
  not_signed_in: 401,
  not_verified: 403,
  not_allowed: 403,
  not_found: 404,
  conflict: 409,
  draft_conflict: 409,
  too_large: 413,
  unsupported_media: 415,
  rate_limited: 429,
  unavailable: 503,
  internal: 500,
} as const;

/** A machine-readable reason for a refusal. */
export type ErrorCode = keyof typeof errorStatus;

const errorCodes = Object.keys(errorStatus) as [ErrorCode, ...ErrorCode[]];

/**
 * The body of every refused request. `message` is written for the person; `fields` puts a message
 * beside each field by its name; `id` can be quoted to an administrator when the fault is ours.
 */
export const errorResponse = z.object({
  error: z.object({
    code: z.enum(errorCodes),
    message: z.string(),
    field: z.string().optional(),
    fields: z.record(z.string(), z.string()).optional(),
    id: z.string().optional(),
  }),
});

export type ErrorResponse = z.infer<typeof errorResponse>;
