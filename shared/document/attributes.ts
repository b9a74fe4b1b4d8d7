import { z } from "zod";
import { isAllowedHref } from "./href.ts";

const none = z.strictObject({}).optional();
const span = z.int().min(1).max(20);
const cell = z
  .strictObject({
    colspan: span.optional(),
    rowspan: span.optional(),
    colwidth: z.array(z.int().min(1).max(2000)).max(20).nullish(),
  })
  .optional();

/** What each node may carry. A node that is not listed is not part of a document. */
export const nodeAttributes: Readonly<Record<string, z.ZodType>> = {
  doc: none,
  paragraph: none,
  text: none,
  bulletList: none,
  listItem: none,
  blockquote: none,
  horizontalRule: none,
  hardBreak: none,
  table: none,
  tableRow: none,
  caution: none,
  photoGroup: none,
  heading: z.strictObject({
    level: z.union([z.literal(2), z.literal(3)], { error: "A heading is of level 2 or 3." }),
  }),
  orderedList: z.strictObject({ start: z.int().min(0).max(100_000).optional() }).optional(),
  codeBlock: z
    .strictObject({
      language: z
        .string()
        .regex(/^[\w+#.-]{1,30}$/, "A code block's language is one short word.")
        .nullish(),
    })
    .optional(),
  tableHeader: cell,
  tableCell: cell,
  photo: z.strictObject({
    photoId: z.uuid("A photo is still missing its file."),
    alt: z.string().max(500, "A photo's description may be at most 500 characters.").nullish(),
    caption: z.string().max(300, "A photo's caption may be at most 300 characters.").optional(),
  }),
  working: z.strictObject({
    workingId: z.uuid("A working has no identifier."),
    calculator: z.string().regex(/^[a-z0-9-]{1,60}$/, "A working names no calculator."),
    title: z.string().max(120, "A working's title may be at most 120 characters.").optional(),
    inputs: z.record(z.string().max(80), z.unknown()),
  }),
};

/** What each mark may carry. */
export const markAttributes: Readonly<Record<string, z.ZodType>> = {
  bold: none,
  italic: none,
  strike: none,
  code: none,
  link: z.strictObject({
    href: z
      .string()
      .refine(
        isAllowedHref,
        "A link must start with http://, https:// or mailto:, or be a path on this site that starts with one /.",
      ),
  }),
};

/** The outline of any node; its attributes are checked by name. */
export const nodeOutline = z.strictObject({
  type: z.string(),
  attrs: z.unknown().optional(),
  content: z.array(z.unknown()).optional(),
  marks: z.array(z.strictObject({ type: z.string(), attrs: z.unknown().optional() })).optional(),
  text: z.string().optional(),
});
