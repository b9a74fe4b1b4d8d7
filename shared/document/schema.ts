import { getSchema } from "@tiptap/core";
import type { Schema } from "@tiptap/pm/model";
import { documentNodes } from "./nodes.ts";

let schema: Schema | undefined;

/** The ProseMirror schema of a document, made on first use. */
export function documentSchema(): Schema {
  schema ??= getSchema(documentNodes);
  return schema;
}
