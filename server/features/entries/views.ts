import type { Connection } from "#server/db/client.ts";
import type { EntryDraft, WorkingView } from "#shared/contracts/entries.ts";
import { photosIn, workingsIn } from "#shared/document/read.ts";
import { parseDocument } from "./content.ts";
import type { EntryParts } from "./parts.ts";
import type { EntryRow, OwnedEntry } from "./repository.ts";
import { findWorkings, type WorkingRow } from "./working-repository.ts";

/** True when readers see something else than the draft now says. */
export function hasUnpublishedChanges({
  version,
  publishedVersion,
}: Pick<EntryRow, "version" | "publishedVersion">): boolean {
  return publishedVersion !== null && version !== publishedVersion;
}

/** A working as the builder last saved it. */
export function draftWorking(row: WorkingRow): WorkingView {
  return {
    id: row.id,
    number: row.number,
    title: row.title,
    calculator: row.calculator,
    version: row.version,
    inputs: JSON.parse(row.inputs),
    results: JSON.parse(row.results),
  };
}

/** A working as it was when its entry was published; null when it was not. */
export function publishedWorking(row: WorkingRow): WorkingView | null {
  if (row.published === null) return null;
  return { id: row.id, number: row.number, ...JSON.parse(row.published) };
}

/** The builder's own copy, with the photos and workings that stand in it. */
export function toDraft(
  { builds, photoViews }: Pick<EntryParts, "builds" | "photoViews">,
  connection: Connection,
  { entry, build }: OwnedEntry,
): EntryDraft {
  const document = parseDocument(entry.document);
  const rows = findWorkings(
    connection,
    workingsIn(document).map((each) => each.workingId),
  );
  const photos = photoViews(photosIn(document).map((each) => each.photoId));
  return {
    id: entry.id,
    build: { id: build.id, slug: build.slug, title: build.title },
    stages: builds.stagesOf(build.id, "all", connection),
    stageId: entry.stageId,
    number: entry.number,
    slug: entry.slug,
    title: entry.title,
    summary: entry.summary,
    document,
    state: entry.state,
    version: entry.version,
    updatedAt: entry.updatedAt,
    scheduledAt: entry.scheduledAt,
    publishedAt: entry.publishedAt,
    hasUnpublishedChanges: hasUnpublishedChanges(entry),
    workings: Object.fromEntries(rows.map((row) => [row.id, draftWorking(row)])),
    photos: Object.fromEntries(photos),
  };
}
