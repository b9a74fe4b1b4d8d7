import { AppError } from "./errors.ts";

/** How many items one page of a list holds. */
export const pageSize = 20;

/** Where a page ended: the time its list is ordered by, and the id that settles equal times. */
export interface PagePosition {
  at: number;
  id: string;
}

/** The position as callers carry it; they are not to look inside. */
export function writeCursor({ at, id }: PagePosition): string {
  return Buffer.from(`${at.toString(36)}.${id}`).toString("base64url");
}

/** Reads a cursor back; undefined starts at the top. */
export function readCursor(cursor: string | undefined): PagePosition | null {
  if (cursor === undefined) return null;
  const [, at, id] =
    /^([0-9a-z]{1,11})\.([0-9a-f-]{36})$/.exec(Buffer.from(cursor, "base64url").toString()) ?? [];
  if (!at || !id)
    throw new AppError("invalid_input", "This page of the list is not known. Start from its top.");
  return { at: Number.parseInt(at, 36), id };
}

/**
 * Cuts one page off rows that were read one beyond it.
 *
 * @param rows at most `pageSize + 1` of them, in the list's order
 */
export function onePage<Row>(rows: Row[], position: (row: Row) => PagePosition) {
  const page = rows.slice(0, pageSize);
  const last = page.at(-1);
  return { page, next: rows.length > pageSize && last ? writeCursor(position(last)) : null };
}
