import type { ErrorRequestHandler, Response } from "express";
import type { Logger } from "pino";
import { v7 as uuid } from "uuid";
import type { ZodError } from "zod";
import { type ErrorCode, type ErrorResponse, errorStatus } from "#shared/contracts/errors.ts";

interface ErrorDetail {
  field?: string;
  fields?: Record<string, string>;
}

/** A refusal that the caller should read: thrown by services, sent by `handleErrors`. */
export class AppError extends Error {
  override name = "AppError";
  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly detail: ErrorDetail = {},
  ) {
    super(message);
  }
}

/** The caller's input did not fit the contract: one message beside each field. */
export function invalidInput(error: ZodError): AppError {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) fields[issue.path.join(".")] ??= issue.message;
  const [first] = Object.values(fields);
  return new AppError("invalid_input", first ?? "Something in this form is not right.", { fields });
}

/** Maps what was thrown to what is sent; faults of ours are logged under an id and hidden behind it. */
export function toErrorResponse(thrown: unknown, log: Logger): { status: number; body: ErrorResponse } {
  const known = thrown instanceof AppError ? thrown : fromLibrary(thrown);
  if (known) {
    const { code, message, detail } = known;
    return { status: errorStatus[code], body: { error: { code, message, ...detail } } };
  }
  const id = uuid();
  log.error({ err: thrown, errorId: id }, "unexpected fault");
  const message = "Something went wrong on our side. Try again; if it stays, quote the number below.";
  return { status: 500, body: { error: { code: "internal", message, id } } };
}

/** Errors that Express's own parsers throw carry a status and are the caller's. */
function fromLibrary(thrown: unknown): AppError | null {
  if (!(thrown instanceof Error) || !("status" in thrown)) return null;
  if (thrown.status === 413) return new AppError("too_large", "That is more than can be sent at once.");
  if (thrown.status === 400) return new AppError("invalid_input", "The request could not be read.");
  return null;
}

export function sendError(res: Response, thrown: unknown, log: Logger): void {
  const { status, body } = toErrorResponse(thrown, log);
  res.status(status).set("Cache-Control", "no-store").json(body);
}

/** The one place where a thrown error becomes an answer. */
export function handleErrors(log: Logger): ErrorRequestHandler {
  return (thrown, _req, res, next) => {
    if (res.headersSent) {
      next(thrown);
      return;
    }
    sendError(res, thrown, log);
  };
}
