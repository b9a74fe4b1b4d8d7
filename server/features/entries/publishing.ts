import { z } from "zod";
import { recordAudit } from "#server/db/audit.ts";
import type { Connection } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import type { Person } from "#server/http/viewer.ts";
import { type EntryDraft, titleForPublishing } from "#shared/contracts/entries.ts";
import { countWords, photosIn, workingsIn } from "#shared/document/read.ts";
import type { PhotoAttributes } from "#shared/document/types.ts";
import { documentFault, parseDocument } from "./content.ts";
import { keepRevision } from "./keeping.ts";
import { checkVersion, type EntryParts, findOwn, writing } from "./parts.ts";
import {
  findBuildPhotos,
  findOwnedEntry,
  moveEntrySlug,
  nextEntryNumber,
  type OwnedEntry,
  refreshBuildDates,
  setEntryPhotos,
  takenEntrySlugs,
  updateEntry,
} from "./repository.ts";
import { hasUnpublishedChanges, toDraft } from "./views.ts";
import { publishWorkings } from "./working-repository.ts";

const publishJob = z.object({ entryId: z.uuid(), at: z.int() });
const furthestMs = 366 * 24 * 3600_000;

/** Publishing, now or at a time, and what may be done to a public entry. */
export function createPublishing(parts: EntryParts) {
  const { database, clock, queue, log } = parts;

  /** Changes the viewer's own entry in one transaction, and answers with what it then is. */
  function change(viewer: Person, id: string, act: (tx: Connection, own: OwnedEntry) => void): EntryDraft {
    return database.transaction((tx) => {
      act(tx, findOwn(tx, viewer, id));
      return toDraft(parts, tx, findOwn(tx, viewer, id));
    }, writing);
  }

  function publish(viewer: Person, id: string, baseVersion: number): EntryDraft {
    return change(viewer, id, (tx, own) => {
      checkVersion(own, baseVersion);
      if (own.entry.state === "public" && !hasUnpublishedChanges(own.entry)) return;
      checkFit(tx, own);
      show(tx, own, viewer.id);
    });
  }

  /** Lets readers see what the draft now says. */
  function show(tx: Connection, { entry }: OwnedEntry, actorId: string | null): void {
    const now = clock();
    const document = parseDocument(entry.document);
    const photos = photosIn(document);
    updateEntry(tx, entry.id, {
      state: "public",
      number: entry.number ?? nextEntryNumber(tx, entry.buildId),
      publishedTitle: entry.title,
      publishedSummary: entry.summary,
      publishedDocument: entry.document,
      publishedStageId: entry.stageId,
      publishedVersion: entry.version,
      publishedPhotoId: photos[0]?.photoId ?? null,
      publishedPhotoAlt: photos[0]?.alt ?? "",
      publishedAt: entry.publishedAt ?? now,
      publishedUpdatedAt: now,
      scheduledAt: null,
    });
    setEntryPhotos(
      tx,
      entry.id,
      photos.map((each) => each.photoId),
    );
    publishWorkings(
      tx,
      entry.id,
      workingsIn(document).map((each) => each.workingId),
    );
    keepRevision(tx, entry, {
      words: countWords(document),
      authorId: entry.authorId,
      reason: "publish",
      now,
    });
    refreshBuildDates(tx, entry.buildId);
    audit(tx, actorId, "entry.publish", entry.id, { version: entry.version });
  }

  /** Puts an entry on the schedule, moves it there, or (null) takes it off. */
  function schedule(
    viewer: Person,
    id: string,
    { baseVersion, at }: { baseVersion: number; at: number | null },
  ) {
    return change(viewer, id, (tx, own) => {
      checkVersion(own, baseVersion);
      if (at === null) unschedule(tx, own, viewer.id);
      else scheduleAt(tx, own, viewer.id, at);
    });
  }

  function scheduleAt(tx: Connection, own: OwnedEntry, actorId: string, at: number): void {
    const { entry } = own;
    if (entry.state === "public") {
      throw new AppError(
        "conflict",
        "This entry is public already. Publish its changes now, or withdraw it first.",
      );
    }
    const now = clock();
    if (at <= now) throw timeFault("That time has passed. Choose a later one, or publish now.");
    if (at > now + furthestMs) throw timeFault("Choose a time within the next twelve months.");
    checkFit(tx, own);
    updateEntry(tx, entry.id, { state: "scheduled", scheduledAt: at });
    queue.enqueue(
      "entry.publish",
      { entryId: entry.id, at },
      { runAt: at, uniqueKey: `entry.publish:${entry.id}:${at}`, connection: tx },
    );
    audit(tx, actorId, "entry.schedule", entry.id, { at });
  }

  /** Back to what it was: withdrawn when readers have seen it before, a draft otherwise. */
  function unschedule(tx: Connection, { entry }: OwnedEntry, actorId: string | null): void {
    if (entry.state === "public" || entry.state === "withdrawn") return;
    updateEntry(tx, entry.id, {
      state: entry.publishedAt === null ? "draft" : "withdrawn",
      scheduledAt: null,
    });
    audit(tx, actorId, "entry.unschedule", entry.id);
  }

  /**
   * The job of a schedule. It looks again at everything: run twice, run late, or run after the builder
   * changed the time, it publishes once and at the time that holds. What can no longer be published goes
   * back to the drafts.
   */
  function publishScheduled({ entryId, at }: z.infer<typeof publishJob>): void {
    database.transaction((tx) => {
      const own = findOwnedEntry(tx, entryId);
      if (own?.entry.state !== "scheduled" || own.entry.scheduledAt !== at || at > clock()) return;
      try {
        checkFit(tx, own);
      } catch (error) {
        if (!(error instanceof AppError)) throw error;
        log.warn({ entry: entryId, reason: error.message }, "a scheduled entry could not be published");
        unschedule(tx, own, null);
        return;
      }
      show(tx, own, null);
    }, writing);
  }

  function withdraw(viewer: Person, id: string): EntryDraft {
    return change(viewer, id, (tx, { entry }) => {
      if (entry.state === "withdrawn") return;
      if (entry.state !== "public") {
        throw new AppError("conflict", "This entry is not public, so there is nothing to withdraw.");
      }
      updateEntry(tx, id, { state: "withdrawn" });
      refreshBuildDates(tx, entry.buildId);
      audit(tx, viewer.id, "entry.withdraw", id);
    });
  }

  function rename(viewer: Person, id: string, slug: string): EntryDraft {
    return change(viewer, id, (tx, { entry }) => {
      if (slug === entry.slug) return;
      const holder = takenEntrySlugs(tx, entry.buildId, slug).get(slug);
      if (holder !== undefined && holder !== id) {
        const message = "Another entry of this build has this address, or had it once. Choose another.";
        throw new AppError("conflict", message, { fields: { slug: message } });
      }
      moveEntrySlug(tx, entry, slug, entry.publishedAt !== null);
      updateEntry(tx, id, { slug });
      audit(tx, viewer.id, "entry.rename", id, { from: entry.slug, to: slug });
    });
  }

  function audit(tx: Connection, actorId: string | null, action: string, id: string, detail = {}): void {
    recordAudit(tx, { at: clock(), actorId, action, subjectKind: "entry", subjectId: id, detail });
  }

  /** Registers the job, before anything is scheduled. */
  function registerJobs(): void {
    queue.register("entry.publish", publishJob, publishScheduled);
  }

  return { publish, schedule, withdraw, rename, registerJobs };
}

/** What readers get must have a title, and words in place of each photo for those who do not see it. */
function checkFit(tx: Connection, { entry }: OwnedEntry): void {
  const title = titleForPublishing.safeParse(entry.title);
  if (!title.success) {
    const message = title.error.issues[0]?.message ?? "The title is missing.";
    throw new AppError("invalid_input", message, { fields: { title: message } });
  }
  const photos = photosIn(parseDocument(entry.document));
  const untold = photos.findIndex(({ alt }) => alt === null);
  if (untold >= 0) {
    throw documentFault(
      `${photoName(photos, untold)} has no description. Say what it shows, or mark it as decoration.`,
    );
  }
  const states = new Map(
    findBuildPhotos(
      tx,
      entry.buildId,
      photos.map((each) => each.photoId),
    ).map(({ id, state }) => [id, state]),
  );
  const broken = photos.findIndex(({ photoId }) => (states.get(photoId) ?? "failed") === "failed");
  if (broken >= 0) {
    throw documentFault(
      `${photoName(photos, broken)} could not be made ready. Take it out or upload it again.`,
    );
  }
}

function photoName(photos: PhotoAttributes[], index: number): string {
  const caption = photos[index]?.caption;
  return caption ? `Photo ${index + 1} ("${caption}")` : `Photo ${index + 1}`;
}

function timeFault(message: string): AppError {
  return new AppError("invalid_input", message, { fields: { at: message } });
}
