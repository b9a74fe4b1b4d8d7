import { v7 as uuid } from "uuid";
import type { Connection } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import { type CheckedDocument, documentFault, type WorkedWorking } from "./content.ts";
import { type EntryRow, findBuildPhotos, stageIsOfBuild } from "./repository.ts";
import { findLastRevision, insertRevision, type RevisionRow, updateRevision } from "./revision-repository.ts";
import { findWorkings, putWorkings, takeWorkingNumbers } from "./working-repository.ts";

/** Autosaves this close to the start of a revision go into it, so that history is not one line a second. */
const foldMs = 5 * 60_000;

/** Keeps what the draft now says in its history. Publishing and restoring always get a revision of their own. */
export function keepRevision(
  tx: Connection,
  entry: Pick<EntryRow, "id" | "title" | "summary" | "document">,
  { words, authorId, reason, now }: Pick<RevisionRow, "words" | "authorId" | "reason"> & { now: number },
): void {
  const content = { title: entry.title, summary: entry.summary, document: entry.document, words };
  const last = findLastRevision(tx, entry.id);
  const folds =
    reason === "autosave" &&
    last?.reason === "autosave" &&
    last.authorId === authorId &&
    now - last.createdAt < foldMs;
  if (folds) {
    updateRevision(tx, last.id, content);
    return;
  }
  const number = (last?.number ?? 0) + 1;
  insertRevision(tx, { id: uuid(), entryId: entry.id, number, authorId, reason, createdAt: now, ...content });
}

/** Keeps the workings of a saved document, and numbers those that are new to the build. */
export function keepWorkings(
  tx: Connection,
  entry: Pick<EntryRow, "id" | "buildId">,
  workings: WorkedWorking[],
  { authorId, now }: { authorId: string; now: number },
): void {
  const present = new Map(
    findWorkings(
      tx,
      workings.map((each) => each.id),
    ).map((row) => [row.id, row]),
  );
  const foreign = workings.find(({ id }) => (present.get(id)?.entryId ?? entry.id) !== entry.id);
  if (foreign) {
    throw documentFault(
      `The working "${foreign.title || foreign.run.calculator}" belongs to another entry. Put in a new one with its inputs.`,
    );
  }
  const fresh = workings.filter(({ id }) => !present.has(id));
  let next = fresh.length > 0 ? takeWorkingNumbers(tx, entry.buildId, fresh.length) : 0;
  const rows = workings.map(({ id, title, run }) => ({
    id,
    buildId: entry.buildId,
    entryId: entry.id,
    number: present.get(id)?.number ?? next++,
    authorId,
    calculator: run.calculator,
    title,
    version: run.version,
    inputs: JSON.stringify(run.inputs),
    results: JSON.stringify(run.results),
    createdAt: now,
    updatedAt: now,
  }));
  putWorkings(tx, rows);
}

/** Refuses a document with photos that are not of this build. */
export function checkPhotos(tx: Connection, buildId: string, { photos }: CheckedDocument): void {
  const ids = [...new Set(photos.map((each) => each.photoId))];
  if (findBuildPhotos(tx, buildId, ids).length === ids.length) return;
  throw documentFault("A photo in this entry is not one of this build. Take it out and upload it here.");
}

export function checkStage(tx: Connection, stageId: string, buildId: string): void {
  if (stageIsOfBuild(tx, stageId, buildId)) return;
  const message = "This stage is not in the build any more. Choose another.";
  throw new AppError("invalid_input", message, { fields: { stageId: message } });
}
