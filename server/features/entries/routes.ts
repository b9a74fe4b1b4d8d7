import { type Route, route } from "#server/http/endpoints.ts";
import { signedIn } from "#server/http/policy.ts";
import { latestEntries } from "#shared/contracts/builds.ts";
import {
  copyDraft,
  createEntry,
  deleteEntry,
  getDraft,
  getEntry,
  getOwnBuild,
  getRevision,
  listOwnBuilds,
  listRevisions,
  publishEntry,
  renameEntry,
  restoreRevision,
  saveDraft,
  scheduleEntry,
  withdrawEntry,
} from "#shared/contracts/entries.ts";
import type { EntryService } from "./service.ts";

/** The API of entries: reading them, and a builder's work on them. */
export function entryRoutes(entries: EntryService): Route[] {
  return [...readingRoutes(entries), ...draftRoutes(entries), ...publishingRoutes(entries)];
}

function readingRoutes({ reading, workshop }: EntryService): Route[] {
  return [
    route(latestEntries, ({ query }) => reading.latest(query.after)),
    route(getEntry, ({ params }, { viewer }) => reading.get(viewer, params.build, params.entry)),
    route(listOwnBuilds, (_request, { viewer }) => ({
      builds: workshop.list(signedIn(viewer)),
      scheduled: workshop.scheduled(signedIn(viewer)),
    })),
    route(getOwnBuild, ({ params }, { viewer }) => workshop.get(signedIn(viewer), params.build)),
  ];
}

function draftRoutes({ drafts, history }: EntryService): Route[] {
  return [
    route(createEntry, ({ params, body }, { viewer }) => drafts.create(signedIn(viewer), params.build, body)),
    route(getDraft, ({ params }, { viewer }) => drafts.get(signedIn(viewer), params.entry)),
    route(saveDraft, ({ params, body }, { viewer }) => drafts.save(signedIn(viewer), params.entry, body)),
    route(copyDraft, ({ params, body }, { viewer }) => drafts.copy(signedIn(viewer), params.entry, body)),
    route(deleteEntry, ({ params }, { viewer }) => {
      drafts.remove(signedIn(viewer), params.entry);
      return { done: true as const };
    }),
    route(listRevisions, ({ params }, { viewer }) => ({
      revisions: history.list(signedIn(viewer), params.entry),
    })),
    route(getRevision, ({ params }, { viewer }) =>
      history.get(signedIn(viewer), params.entry, params.revision),
    ),
    route(restoreRevision, ({ params, body }, { viewer }) =>
      history.restore(signedIn(viewer), params.entry, params.revision, body.baseVersion),
    ),
  ];
}

function publishingRoutes({ publishing }: EntryService): Route[] {
  return [
    route(publishEntry, ({ params, body }, { viewer }) =>
      publishing.publish(signedIn(viewer), params.entry, body.baseVersion),
    ),
    route(scheduleEntry, ({ params, body }, { viewer }) =>
      publishing.schedule(signedIn(viewer), params.entry, body),
    ),
    route(withdrawEntry, ({ params }, { viewer }) => publishing.withdraw(signedIn(viewer), params.entry)),
    route(renameEntry, ({ params, body }, { viewer }) =>
      publishing.rename(signedIn(viewer), params.entry, body.slug),
    ),
  ];
}
