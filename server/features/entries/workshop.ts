import { AppError } from "#server/http/errors.ts";
import type { Person } from "#server/http/viewer.ts";
import type { BuildSummary } from "#shared/contracts/builds.ts";
import type { ScheduledEntry, WorkshopBuild } from "#shared/contracts/entries.ts";
import type { EntryParts } from "./parts.ts";
import { listOwnBuilds, listOwnEntries, listScheduled } from "./reading-repository.ts";
import { hasUnpublishedChanges } from "./views.ts";

/** The builder's own side: every build of theirs, every entry in every state. */
export function createWorkshop({ database, builds }: EntryParts) {
  function list(viewer: Person): (BuildSummary & { draftCount: number })[] {
    const own = listOwnBuilds(database, viewer.id);
    const summaries = builds.summaries(own.map(({ id }) => id));
    return own.flatMap(({ id, draftCount }) => {
      const build = summaries.get(id);
      return build ? [{ ...build, draftCount }] : [];
    });
  }

  function scheduled(viewer: Person): ScheduledEntry[] {
    return listScheduled(database, viewer.id).flatMap(({ id, title, scheduledAt, buildSlug, buildTitle }) =>
      scheduledAt === null ? [] : [{ id, title, scheduledAt, build: { slug: buildSlug, title: buildTitle } }],
    );
  }

  function get(viewer: Person, slug: string): WorkshopBuild {
    const build = builds.find(slug);
    const summary = build?.ownerId === viewer.id ? builds.summaries([build.id]).get(build.id) : undefined;
    if (!build || !summary) throw new AppError("not_found", "There is no such build in your workshop.");
    return {
      ...summary,
      createdAt: build.createdAt,
      stages: builds.stagesOf(build.id, "all"),
      entries: listOwnEntries(database, build.id).map((entry) => ({
        ...entry,
        hasUnpublishedChanges: hasUnpublishedChanges(entry),
      })),
    };
  }

  return { list, scheduled, get };
}
