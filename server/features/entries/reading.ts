import { AppError } from "#server/http/errors.ts";
import { onePage, pageSize, readCursor } from "#server/http/paging.ts";
import type { Viewer } from "#server/http/viewer.ts";
import type { BuildSummary, EntrySummary } from "#shared/contracts/builds.ts";
import type { EntryPage } from "#shared/contracts/entries.ts";
import { photosIn } from "#shared/document/read.ts";
import { parseDocument } from "./content.ts";
import type { EntryParts } from "./parts.ts";
import {
  findNeighbours,
  findPublicEntry,
  type ListedRow,
  latestPublic,
  listPublicAddresses,
  listPublicOfBuild,
} from "./reading-repository.ts";
import { publishedWorking } from "./views.ts";
import { workingsOfEntry } from "./working-repository.ts";

/** A public entry in a list, with what feeds need beside. */
export interface ListedEntry extends EntrySummary {
  updatedAt: number;
}

export type LatestEntry = ListedEntry & { build: BuildSummary };

/** What anyone may read: only what is public, as it was published. */
export function createReading({ database, builds, photoViews }: EntryParts) {
  /** Rows as cards, with the photos of all of them read at once. */
  function toListed(rows: ListedRow[]): ListedEntry[] {
    const photos = photoViews(rows.flatMap(({ photoId }) => photoId ?? []));
    return rows.map((row) => ({
      id: row.id,
      number: row.number ?? 0,
      slug: row.slug,
      title: row.title ?? "",
      summary: row.summary ?? "",
      stageId: row.stageId ?? "",
      publishedAt: row.publishedAt ?? 0,
      updatedAt: row.updatedAt ?? 0,
      photo: row.photoId ? (photos.get(row.photoId) ?? null) : null,
      photoAlt: row.photoAlt,
    }));
  }

  function ofBuild(buildId: string): ListedEntry[] {
    return toListed(listPublicOfBuild(database, buildId));
  }

  function latest(cursor: string | undefined): { items: LatestEntry[]; next: string | null } {
    const rows = latestPublic(database, readCursor(cursor)).all();
    const { page, next } = onePage(rows, ({ publishedAt, id }) => ({ at: publishedAt ?? 0, id }));
    const summaries = builds.summaries(page.map(({ buildId }) => buildId));
    const listed = toListed(page);
    const items = page.flatMap(({ buildId }, index) => {
      const build = summaries.get(buildId);
      const entry = listed[index];
      return build && entry ? [{ ...entry, build }] : [];
    });
    return { items, next };
  }

  function get(viewer: Viewer, buildSlug: string, entrySlug: string): EntryPage {
    const owner = builds.find(buildSlug);
    const row = owner && findPublicEntry(database, owner.id, entrySlug);
    const build = owner && builds.summaries([owner.id]).get(owner.id);
    const stage = owner && builds.stagesOf(owner.id, "public").find(({ id }) => id === row?.stageId);
    const [listed] = row ? toListed([row]) : [];
    if (!row?.document || !build || !stage || !listed) {
      throw new AppError("not_found", "There is no such entry.");
    }
    const document = parseDocument(row.document);
    const photos = photoViews(photosIn(document).map((each) => each.photoId));
    const workings = workingsOfEntry(database, row.id).flatMap((each) => publishedWorking(each) ?? []);
    const { previous, next } = findNeighbours(database, owner.id, listed.number);
    return {
      ...listed,
      document,
      build,
      stage,
      previous: toNeighbour(previous),
      next: toNeighbour(next),
      mine: owner.ownerId === viewer?.id,
      workings: Object.fromEntries(workings.map((each) => [each.id, each])),
      photos: Object.fromEntries(photos),
    };
  }

  /** A public build with its newest entries first, at a present or former address; null when there is none. */
  function newestOfBuild(slug: string): { build: BuildSummary; entries: ListedEntry[] } | null {
    const found = builds.find(slug);
    const build = found?.publishedAt ? builds.summaries([found.id]).get(found.id) : undefined;
    if (!build) return null;
    const newest = listPublicOfBuild(database, build.id).reverse().slice(0, pageSize);
    return { build, entries: toListed(newest) };
  }

  /** Addresses of public entries with the time each last changed, newest first. */
  function addresses(most: number) {
    return listPublicAddresses(database, most);
  }

  return { ofBuild, latest, get, newestOfBuild, addresses };
}

function toNeighbour(row: { number: number | null; slug: string; title: string | null } | undefined) {
  return row ? { number: row.number ?? 0, slug: row.slug, title: row.title ?? "" } : null;
}
