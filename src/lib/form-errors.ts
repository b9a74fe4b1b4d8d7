import type { FieldValues, Path, UseFormSetError } from "react-hook-form";
import { ApiError } from "./api.ts";

/** A message for the person from whatever was thrown. */
export function messageOf(error: unknown): string {
  if (error instanceof ApiError) return error.message;
  return "Something went wrong. Nothing you typed is lost: try again.";
}

/** Puts the server's messages beside their fields, and what belongs to none of `fields` at the form's head. */
export function showErrors<Values extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<Values>,
  fields: readonly Path<Values>[],
): void {
  const messages = error instanceof ApiError ? error.fields : {};
  const placed = fields.filter((field) => messages[field] !== undefined);
  for (const [index, field] of placed.entries()) {
    setError(field, { type: "server", message: messages[field] ?? "" }, { shouldFocus: index === 0 });
  }
  if (placed.length === 0) setError("root", { type: "server", message: messageOf(error) });
}
