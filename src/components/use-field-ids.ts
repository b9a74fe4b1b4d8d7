import { useId } from "react";

type FieldIds = { id: string; helpId: string; errorId: string; describedBy: string | undefined };

/** Ids that tie a field to its help and its error. */
export function useFieldIds(given: string | undefined, help: unknown, error: unknown): FieldIds {
  const made = useId();
  const id = given ?? made;
  const helpId = `${id}-help`;
  const errorId = `${id}-error`;
  const describedBy = [help ? helpId : "", error ? errorId : ""].filter(Boolean).join(" ") || undefined;
  return { id, helpId, errorId, describedBy };
}
