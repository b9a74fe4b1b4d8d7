import { z } from "zod";

/** A stored thing's identifier: UUID version 7, so that keys sort by age. */
export const id = z.uuid();

/** A moment, in milliseconds since 1970 UTC. */
export const moment = z.int().nonnegative();

/** The part of an address that names a thing: lower case, digits and single hyphens. */
export const slug = z
  .string()
  .min(1)
  .max(80)
  .regex(/^[a-z0-9]+(?:-[a-z0-9]+)*$/, "Use small letters, digits and single hyphens.");

/** Where the next page of a list starts; opaque to the caller. */
export const cursor = z.string().max(200);

/** The query of a paged list. */
export const pageQuery = z.object({ after: cursor.optional() });

/** One line of text that a person must fill in. */
export function requiredLine(label: string, most: number) {
  return z
    .string()
    .trim()
    .min(1, `${label} is missing.`)
    .max(most, `${label} may be at most ${most} characters.`);
}

/** One page of a list, newest first unless told otherwise. */
export function pageOf<Item extends z.ZodType>(item: Item) {
  return z.object({ items: z.array(item), next: cursor.nullable() });
}

/** The answer of a route that has nothing to say but that it was done. */
export const done = z.object({ done: z.literal(true) });
