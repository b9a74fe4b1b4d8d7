import { v4 as randomUuid, v7 as uuid } from "uuid";
import { recordAudit } from "#server/db/audit.ts";
import type { Connection } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import type { Person } from "#server/http/viewer.ts";
import { freeSlug, slugFromTitle } from "#server/naming/slugs.ts";
import type { EntryDraft, SaveDraftBody } from "#shared/contracts/entries.ts";
import { emptyDocument } from "#shared/document/read.ts";
import { type CheckedDocument, checkDocument, withNewWorkings } from "./content.ts";
import { checkPhotos, checkStage, keepRevision, keepWorkings } from "./keeping.ts";
import { checkVersion, type EntryParts, findOwn, writing } from "./parts.ts";
import { type EntryRow, insertEntry, takenEntrySlugs, touchBuild, updateEntry } from "./repository.ts";
import { toDraft } from "./views.ts";

const longestTitle = 140;

/** Drafts: begun, saved, copied and deleted by the builder they belong to. */
export function createDrafts(parts: EntryParts) {
  const { database, clock, builds } = parts;

  function create(
    viewer: Person,
    slug: string,
    { stageId, title }: { stageId: string; title: string },
  ): EntryDraft {
    const build = builds.find(slug);
    if (build?.ownerId !== viewer.id) {
      if (build?.publishedAt) throw new AppError("not_allowed", "Only the builder can write in this build.");
      throw new AppError("not_found", "There is no such build.");
    }
    return begin(viewer, { buildId: build.id, stageId, title, summary: "" }, checkDocument(emptyDocument));
  }

  function get(viewer: Person, id: string): EntryDraft {
    return toDraft(parts, database, findOwn(database, viewer, id));
  }

  /** Saves a draft. Sending the same words twice, as a client does that missed the answer, changes nothing. */
  function save(viewer: Person, id: string, body: SaveDraftBody): EntryDraft {
    const checked = checkDocument(body.document);
    return database.transaction((tx) => {
      const own = findOwn(tx, viewer, id);
      if (!saysTheSame(own.entry, body, checked)) {
        checkVersion(own, body.baseVersion);
        write(tx, viewer, own.entry, body, checked, "autosave");
      }
      return toDraft(parts, tx, findOwn(tx, viewer, id));
    }, writing);
  }

  /** Puts these words into the draft, and keeps them in its history. */
  function write(
    tx: Connection,
    viewer: Person,
    entry: EntryRow,
    words: { title: string; summary: string; stageId: string },
    checked: CheckedDocument,
    reason: "autosave" | "restore",
  ): void {
    const now = clock();
    checkStage(tx, words.stageId, entry.buildId);
    checkPhotos(tx, entry.buildId, checked);
    keepWorkings(tx, entry, checked.workings, { authorId: viewer.id, now });
    const { title, summary, stageId } = words;
    const content = { title, summary, document: checked.json };
    const slug = followTitle(tx, entry, title);
    updateEntry(tx, entry.id, { ...content, stageId, slug, version: entry.version + 1, updatedAt: now });
    touchBuild(tx, entry.buildId, now);
    keepRevision(
      tx,
      { id: entry.id, ...content },
      { words: checked.words, authorId: viewer.id, reason, now },
    );
  }

  function copy(viewer: Person, id: string, body: Omit<SaveDraftBody, "baseVersion">): EntryDraft {
    const { entry } = findOwn(database, viewer, id);
    const checked = checkDocument(withNewWorkings(checkDocument(body.document).document, randomUuid));
    const suffix = " (copy)";
    const title = `${body.title.slice(0, longestTitle - suffix.length)}${suffix}`;
    const { summary, stageId } = body;
    return begin(viewer, { buildId: entry.buildId, stageId, title, summary }, checked);
  }

  function begin(
    viewer: Person,
    start: Pick<EntryRow, "buildId" | "stageId" | "title" | "summary">,
    checked: CheckedDocument,
  ): EntryDraft {
    const now = clock();
    const id = uuid();
    return database.transaction((tx) => {
      checkStage(tx, start.stageId, start.buildId);
      checkPhotos(tx, start.buildId, checked);
      const wanted = slugFromTitle(start.title, untitled);
      const taken = takenEntrySlugs(tx, start.buildId, wanted);
      insertEntry(tx, {
        id,
        ...start,
        authorId: viewer.id,
        slug: freeSlug(wanted, (slug) => taken.has(slug)),
        state: "draft",
        document: checked.json,
        version: 1,
        createdAt: now,
        updatedAt: now,
      });
      keepWorkings(tx, { id, buildId: start.buildId }, checked.workings, { authorId: viewer.id, now });
      keepRevision(
        tx,
        { id, ...start, document: checked.json },
        { words: checked.words, authorId: viewer.id, reason: "autosave", now },
      );
      touchBuild(tx, start.buildId, now);
      audit(tx, viewer, "entry.create", id);
      return toDraft(parts, tx, findOwn(tx, viewer, id));
    }, writing);
  }

  /** Deletes a draft that no reader ever saw. It is kept out of sight for a while, its address is free at once. */
  function remove(viewer: Person, id: string): void {
    database.transaction((tx) => {
      const { entry } = findOwn(tx, viewer, id);
      if (entry.publishedAt !== null) {
        throw new AppError("conflict", "This entry has been public. Withdraw it instead of deleting it.");
      }
      updateEntry(tx, id, {
        deletedAt: clock(),
        state: "draft",
        scheduledAt: null,
        slug: `deleted-${id}`,
      });
      audit(tx, viewer, "entry.delete", id);
    }, writing);
  }

  function audit(tx: Connection, viewer: Person, action: string, id: string): void {
    recordAudit(tx, { at: clock(), actorId: viewer.id, action, subjectKind: "entry", subjectId: id });
  }

  return { create, get, save, copy, remove, write };
}

export type Drafts = ReturnType<typeof createDrafts>;

const untitled = "untitled";

function saysTheSame(
  entry: EntryRow,
  { title, summary, stageId }: SaveDraftBody,
  { json }: CheckedDocument,
): boolean {
  return (
    entry.title === title && entry.summary === summary && entry.stageId === stageId && entry.document === json
  );
}

/**
 * Until an entry is first published its address follows its title, unless the builder chose another one.
 * Afterwards only renaming changes it.
 */
function followTitle(tx: Connection, entry: EntryRow, title: string): string {
  const before = slugFromTitle(entry.title, untitled);
  const wanted = slugFromTitle(title, untitled);
  const chosen = entry.slug !== before && !new RegExp(`^${before}-\\d+$`).test(entry.slug);
  if (entry.publishedAt !== null || chosen || wanted === before) return entry.slug;
  const taken = takenEntrySlugs(tx, entry.buildId, wanted);
  return freeSlug(wanted, (slug) => (taken.get(slug) ?? entry.id) !== entry.id);
}
