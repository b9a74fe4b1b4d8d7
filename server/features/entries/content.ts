import { AppError } from "#server/http/errors.ts";
import { type CalculatorRun, runCalculator } from "#shared/calculators/registry.ts";
import type { DocumentJson } from "#shared/contracts/entries.ts";
import { countWords, photosIn, workingsIn } from "#shared/document/read.ts";
import type { PhotoAttributes, RichDocument } from "#shared/document/types.ts";
import { validateDocument } from "#shared/document/validate.ts";

/** A working of a document with its sum done. */
export interface WorkedWorking {
  id: string;
  title: string;
  run: CalculatorRun;
}

/** A document that passed every check, and what stands in it. */
export interface CheckedDocument {
  document: DocumentJson;
  json: string;
  words: number;
  photos: PhotoAttributes[];
  workings: WorkedWorking[];
}

/** Checks a document and works its sums; refuses it with a message for the builder otherwise. */
export function checkDocument(json: unknown): CheckedDocument {
  const valid = validateDocument(json);
  if (!valid.ok) throw documentFault(valid.issue.message);
  const document = valid.value;
  return {
    document,
    json: JSON.stringify(document),
    words: countWords(document),
    photos: photosIn(document),
    workings: workingsIn(document).map(({ workingId, calculator, title, inputs }) => {
      const run = runCalculator(calculator, inputs);
      if (!run.ok) {
        throw documentFault(`The working "${title || calculator}" does not come out. ${run.issue.message}`);
      }
      return { id: workingId, title, run: run.value };
    }),
  };
}

/** A document kept earlier, which was checked then. */
export function parseDocument(json: string): DocumentJson {
  return JSON.parse(json) as DocumentJson;
}

export function documentFault(message: string): AppError {
  return new AppError("invalid_input", message, { fields: { document: message } });
}

/** The same document with a new id for each of its workings, so that a copy's are numbered as its own. */
export function withNewWorkings(document: DocumentJson, newId: () => string): DocumentJson {
  const renew = (node: RichDocument["content"][number]): typeof node => ({
    ...node,
    ...(node.type === "working" && { attrs: { ...node.attrs, workingId: newId() } }),
    ...(node.content && { content: node.content.map(renew) }),
  });
  return { type: "doc", content: (document as RichDocument).content.map(renew) };
}
