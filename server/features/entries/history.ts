import { recordAudit } from "#server/db/audit.ts";
import type { Connection } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import type { Person } from "#server/http/viewer.ts";
import { runCalculator } from "#shared/calculators/registry.ts";
import type { DocumentJson, EntryDraft, RevisionSummary, WorkingView } from "#shared/contracts/entries.ts";
import type { PhotoView } from "#shared/contracts/photos.ts";
import { photosIn, workingsIn } from "#shared/document/read.ts";
import { checkDocument, parseDocument } from "./content.ts";
import type { Drafts } from "./drafts.ts";
import { checkVersion, type EntryParts, findOwn, writing } from "./parts.ts";
import { findRevision, listRevisionRows, type RevisionRow } from "./revision-repository.ts";
import { draftWorking, toDraft } from "./views.ts";
import { findWorkings } from "./working-repository.ts";

export interface KeptRevision extends RevisionSummary {
  summary: string;
  document: DocumentJson;
  workings: Record<string, WorkingView>;
  photos: Record<string, PhotoView>;
}

/** An entry's kept revisions, for its builder. */
export function createHistory(parts: EntryParts, drafts: Drafts) {
  const { database, clock, photoViews } = parts;

  function list(viewer: Person, id: string): RevisionSummary[] {
    findOwn(database, viewer, id);
    return listRevisionRows(database, id);
  }

  function get(viewer: Person, id: string, number: number): KeptRevision {
    findOwn(database, viewer, id);
    const revision = findKept(database, id, number);
    const document = parseDocument(revision.document);
    const photos = photoViews(photosIn(document).map((each) => each.photoId));
    return {
      number: revision.number,
      title: revision.title,
      reason: revision.reason,
      createdAt: revision.createdAt,
      words: revision.words,
      summary: revision.summary,
      document,
      workings: workingsThen(document),
      photos: Object.fromEntries(photos),
    };
  }

  /** The workings with the inputs they had in this revision; one that no longer comes out is left out. */
  function workingsThen(document: DocumentJson): Record<string, WorkingView> {
    const then = workingsIn(document);
    const rows = new Map(
      findWorkings(
        database,
        then.map((each) => each.workingId),
      ).map((row) => [row.id, row]),
    );
    const views = then.flatMap(({ workingId, calculator, title, inputs }) => {
      const row = rows.get(workingId);
      const run = runCalculator(calculator, inputs);
      if (!row || !run.ok) return [];
      const { version, results, inputs: complete } = run.value;
      return [
        { ...draftWorking(row), calculator, title, version, inputs: complete, results: { ...results } },
      ];
    });
    return Object.fromEntries(views.map((view) => [view.id, view]));
  }

  /** Makes a revision the draft again. What the draft said stays in the history, as every save is kept there. */
  function restore(viewer: Person, id: string, number: number, baseVersion: number): EntryDraft {
    return database.transaction((tx) => {
      const own = findOwn(tx, viewer, id);
      checkVersion(own, baseVersion);
      const { title, summary, document } = findKept(tx, id, number);
      const { stageId } = own.entry;
      drafts.write(
        tx,
        viewer,
        own.entry,
        { title, summary, stageId },
        checkDocument(parseDocument(document)),
        "restore",
      );
      recordAudit(tx, {
        at: clock(),
        actorId: viewer.id,
        action: "entry.restore",
        subjectKind: "entry",
        subjectId: id,
        detail: { revision: number },
      });
      return toDraft(parts, tx, findOwn(tx, viewer, id));
    }, writing);
  }

  return { list, get, restore };
}

function findKept(connection: Connection, entryId: string, number: number): RevisionRow {
  const revision = findRevision(connection, entryId, number);
  if (!revision) throw new AppError("not_found", "There is no such revision of this entry.");
  return revision;
}
