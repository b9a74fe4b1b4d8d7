import { v7 as uuid } from "uuid";
import { recordAudit } from "#server/db/audit.ts";
import type { Connection, Database } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import { onePage, readCursor } from "#server/http/paging.ts";
import type { Person, Viewer } from "#server/http/viewer.ts";
import { freeSlug, slugFromTitle } from "#server/naming/slugs.ts";
import type {
  BuildPage,
  BuildStatus,
  BuildSummary,
  CreateBuildBody,
  EntrySummary,
  UpdateBuildBody,
} from "#shared/contracts/builds.ts";
import type { BuildReader } from "./reader.ts";
import {
  type BuildRow,
  findBuildBySlug,
  findPersonIdByHandle,
  insertBuild,
  listPublicCards,
  moveBuildSlug,
  photoIsOfBuild,
  takenBuildSlugs,
  updateBuildRow,
} from "./repository.ts";

export interface BuildParts {
  database: Database;
  clock: () => number;
  reader: BuildReader;
  /** A build's public entries, oldest first; the entries feature has them. */
  publicEntries: (buildId: string) => EntrySummary[];
}

export type BuildService = ReturnType<typeof createBuildService>;

/** Builds: who sees which, and what their owner may change. */
export function createBuildService({ database, clock, reader, publicEntries }: BuildParts) {
  function list(query: {
    after?: string | undefined;
    owner?: string | undefined;
    status?: BuildStatus | undefined;
  }): { items: BuildSummary[]; next: string | null } {
    const after = readCursor(query.after);
    const ownerId = query.owner === undefined ? undefined : findPersonIdByHandle(database, query.owner);
    if (query.owner !== undefined && ownerId === undefined) return { items: [], next: null };
    const rows = listPublicCards(database, { ownerId, status: query.status, after });
    const { page, next } = onePage(rows, ({ build }) => ({ at: build.lastEntryAt ?? 0, id: build.id }));
    return { items: reader.toSummaries(page), next };
  }

  /** The build at a present or former address; until it is public, for its owner alone. */
  function get(viewer: Viewer, slug: string): BuildPage {
    const build = findBuildBySlug(database, slug);
    if (!build || (build.publishedAt === null && build.ownerId !== viewer?.id)) throw noSuchBuild();
    return toPage(build, viewer);
  }

  function toPage(build: BuildRow, viewer: Viewer): BuildPage {
    const summary = reader.summaries([build.id]).get(build.id);
    if (!summary) throw noSuchBuild();
    return {
      ...summary,
      createdAt: build.createdAt,
      stages: reader.stagesOf(build.id, "public"),
      entries: publicEntries(build.id),
      mine: build.ownerId === viewer?.id,
    };
  }

  function create(viewer: Person, { title, purpose, status }: CreateBuildBody): BuildPage {
    const now = clock();
    const build = database.transaction((tx) => {
      const wanted = slugFromTitle(title, "build");
      const taken = takenBuildSlugs(tx, wanted);
      const row: BuildRow = {
        id: uuid(),
        ownerId: viewer.id,
        slug: freeSlug(wanted, (slug) => taken.has(slug)),
        title,
        purpose,
        status,
        coverPhotoId: null,
        coverAlt: "",
        createdAt: now,
        updatedAt: now,
        publishedAt: null,
        lastEntryAt: null,
        lastWorkingNumber: 0,
      };
      insertBuild(tx, row);
      audit(tx, viewer, "build.create", row.id, { slug: row.slug });
      return row;
    });
    return toPage(build, viewer);
  }

  function update(viewer: Person, slug: string, { slug: newSlug, ...change }: UpdateBuildBody): BuildPage {
    const build = database.transaction((tx) => {
      const present = findOwnBuild(tx, viewer, slug);
      const { coverPhotoId } = change;
      if (coverPhotoId && !photoIsOfBuild(tx, coverPhotoId, present.id)) {
        throw new AppError("invalid_input", "The cover must be a photo of this build.", {
          fields: { coverPhotoId: "The cover must be a photo of this build." },
        });
      }
      updateBuildRow(tx, present.id, { ...change, updatedAt: clock() });
      if (newSlug !== undefined && newSlug !== present.slug) rename(tx, viewer, present, newSlug);
      audit(tx, viewer, "build.update", present.id, { fields: Object.keys(change) });
      return findOwnBuild(tx, viewer, newSlug ?? present.slug);
    });
    return toPage(build, viewer);
  }

  function rename(tx: Connection, viewer: Person, build: BuildRow, to: string): void {
    const holder = takenBuildSlugs(tx, to).get(to);
    if (holder !== undefined && holder !== build.id) {
      const message = "Another build has this address, or had it once. Choose another.";
      throw new AppError("conflict", message, { fields: { slug: message } });
    }
    moveBuildSlug(tx, build.id, build.slug, to);
    updateBuildRow(tx, build.id, { slug: to });
    audit(tx, viewer, "build.rename", build.id, { from: build.slug, to });
  }

  function audit(tx: Connection, viewer: Person, action: string, id: string, detail = {}): void {
    recordAudit(tx, {
      at: clock(),
      actorId: viewer.id,
      action,
      subjectKind: "build",
      subjectId: id,
      detail,
    });
  }

  return { list, get, create, update };
}

/** The viewer's own build at an address; others are told that there is none, or that it is not theirs. */
export function findOwnBuild(connection: Connection, viewer: Person, slug: string): BuildRow {
  const build = findBuildBySlug(connection, slug);
  if (build?.ownerId === viewer.id) return build;
  if (build?.publishedAt) throw new AppError("not_allowed", "Only the builder can change this build.");
  throw noSuchBuild();
}

function noSuchBuild(): AppError {
  return new AppError("not_found", "There is no such build.");
}
