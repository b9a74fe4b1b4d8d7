import type { Connection, Database } from "#server/db/client.ts";
import type { BuildSummary, StageView } from "#shared/contracts/builds.ts";
import type { PhotoView } from "#shared/contracts/photos.ts";
import { type BuildCardRow, type BuildRow, findBuildBySlug, findCards } from "./repository.ts";
import { type CountedStageRow, listStages, type StageCount } from "./stage-repository.ts";

/** How photos come to other features: many at once, by id. */
export type PhotoViews = (ids: Iterable<string>) => Map<string, PhotoView>;

export type BuildReader = ReturnType<typeof createBuildReader>;

/** What other features show of builds. Who may see them is asked before. */
export function createBuildReader({ database, photoViews }: { database: Database; photoViews: PhotoViews }) {
  /** Cards for rows, with the photos of all of them read at once. */
  function toSummaries(rows: BuildCardRow[]): BuildSummary[] {
    const ids = rows.flatMap(({ build, owner }) => [build.coverPhotoId, owner.avatarPhotoId]);
    const photos = photoViews(ids.filter((id) => id !== null));
    const photo = (id: string | null) => (id ? (photos.get(id) ?? null) : null);
    return rows.map(({ build, owner, entryCount }) => ({
      id: build.id,
      slug: build.slug,
      title: build.title,
      purpose: build.purpose,
      status: build.status,
      cover: photo(build.coverPhotoId),
      coverAlt: build.coverAlt,
      owner: { handle: owner.handle, name: owner.name, avatar: photo(owner.avatarPhotoId) },
      entryCount,
      lastEntryAt: build.lastEntryAt,
    }));
  }

  /** Cards by build id; ids that are not known are left out. */
  function summaries(ids: Iterable<string>): Map<string, BuildSummary> {
    const wanted = [...new Set(ids)];
    if (wanted.length === 0) return new Map();
    return new Map(toSummaries(findCards(database, wanted)).map((each) => [each.id, each]));
  }

  function stagesOf(buildId: string, which: StageCount, connection: Connection = database): StageView[] {
    return listStages(connection, buildId, which).map(toStageView);
  }

  /** The build at a present or former address, whoever may see it. */
  function find(slug: string): BuildRow | undefined {
    return findBuildBySlug(database, slug);
  }

  return { find, toSummaries, summaries, stagesOf };
}

export function toStageView({ id, title, state, entryCount }: CountedStageRow): StageView {
  return { id, title, state, entryCount };
}
