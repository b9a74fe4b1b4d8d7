import { z } from "zod";
import { buildSummary, entrySummary, stageView } from "./builds.ts";
import { done, id, moment, requiredLine, slug } from "./common.ts";
import { endpoint } from "./endpoint.ts";
import { photoView } from "./photos.ts";

export const entryState = z.enum(["draft", "scheduled", "public", "withdrawn"]);

export type EntryState = z.infer<typeof entryState>;

/**
 * A rich-text document as the editor keeps it. Only its outline is checked here; every node,
 * attribute and mark is checked by `validateDocument` in `#shared/document/validate.ts`.
 */
export const documentJson = z.object({ type: z.literal("doc"), content: z.array(z.unknown()) });

export type DocumentJson = z.infer<typeof documentJson>;

/** A kept working: the calculator, what went in, and what that version of it answered. */
export const workingView = z.object({
  id,
  /** Its number in the build, shown as W12. */
  number: z.int(),
  title: z.string(),
  calculator: z.string(),
  version: z.int(),
  inputs: z.record(z.string(), z.unknown()),
  results: z.record(z.string(), z.unknown()),
});

export type WorkingView = z.infer<typeof workingView>;

const media = {
  /** By working id, those that stand in the document. */
  workings: z.record(z.string(), workingView),
  /** By photo id, those that stand in the document. */
  photos: z.record(z.string(), photoView),
};

const neighbour = z.object({ number: z.int(), slug, title: z.string() }).nullable();

/** A published entry as readers get it. */
export const entryPage = entrySummary.extend({
  document: documentJson,
  updatedAt: moment,
  build: buildSummary,
  stage: stageView,
  previous: neighbour,
  next: neighbour,
  mine: z.boolean(),
  ...media,
});

export type EntryPage = z.infer<typeof entryPage>;

/** The builder's own copy, with what the editor needs to save it back. */
export const entryDraft = z.object({
  id,
  build: z.object({ id, slug, title: z.string() }),
  stages: z.array(stageView),
  stageId: id,
  number: z.int().nullable(),
  slug,
  title: z.string(),
  summary: z.string(),
  document: documentJson,
  state: entryState,
  /** Rises by one with each save; a save names the version it started from. */
  version: z.int(),
  updatedAt: moment,
  scheduledAt: moment.nullable(),
  publishedAt: moment.nullable(),
  /** True when the public entry differs from this draft. */
  hasUnpublishedChanges: z.boolean(),
  ...media,
});

export type EntryDraft = z.infer<typeof entryDraft>;

const entryParams = z.object({ entry: id });

/** Slugs that were renamed answer with the present ones in `build.slug` and `slug`. */
export const getEntry = endpoint({
  method: "GET",
  path: "/api/builds/:build/entries/:entry",
  access: "anyone",
  summary: "A published entry",
  params: z.object({ build: slug, entry: slug }),
  response: entryPage,
});

export const createEntry = endpoint({
  method: "POST",
  path: "/api/builds/:build/entries",
  access: "signed_in",
  summary: "Begin a draft",
  params: z.object({ build: slug }),
  body: z.object({ stageId: id, title: z.string().trim().max(140).default("") }),
  response: entryDraft,
  status: 201,
});

export const getDraft = endpoint({
  method: "GET",
  path: "/api/entries/:entry/draft",
  access: "signed_in",
  summary: "The builder's own copy of an entry",
  params: entryParams,
  response: entryDraft,
});

export const saveDraftBody = z.object({
  baseVersion: z.int(),
  title: z.string().trim().max(140, "The title may be at most 140 characters."),
  summary: z.string().trim().max(300, "The summary may be at most 300 characters."),
  stageId: id,
  document: documentJson,
});

export type SaveDraftBody = z.infer<typeof saveDraftBody>;

/** Answers `draft_conflict` when `baseVersion` is not the latest: fetch the draft, then merge or copy. */
export const saveDraft = endpoint({
  method: "PUT",
  path: "/api/entries/:entry/draft",
  access: "signed_in",
  summary: "Save a draft",
  params: entryParams,
  body: saveDraftBody,
  response: entryDraft,
});

/** Keeps one side of a conflict as a draft of its own beside the original. */
export const copyDraft = endpoint({
  method: "POST",
  path: "/api/entries/:entry/copies",
  access: "signed_in",
  summary: "Keep these words as a new draft",
  params: entryParams,
  body: saveDraftBody.omit({ baseVersion: true }),
  response: entryDraft,
  status: 201,
});

const versionBody = z.object({ baseVersion: z.int() });

export const publishEntry = endpoint({
  method: "POST",
  path: "/api/entries/:entry/publish",
  access: "verified",
  summary: "Publish an entry, or publish the changes made to it since",
  params: entryParams,
  body: versionBody,
  response: entryDraft,
});

export const scheduleEntry = endpoint({
  method: "POST",
  path: "/api/entries/:entry/schedule",
  access: "verified",
  summary: "Publish an entry at a later time; null takes it off the schedule",
  params: entryParams,
  body: versionBody.extend({ at: moment.nullable() }),
  response: entryDraft,
});

export const withdrawEntry = endpoint({
  method: "POST",
  path: "/api/entries/:entry/withdraw",
  access: "signed_in",
  summary: "Take a public entry out of readers' sight",
  params: entryParams,
  response: entryDraft,
});

export const renameEntry = endpoint({
  method: "POST",
  path: "/api/entries/:entry/rename",
  access: "signed_in",
  summary: "Change an entry's address; the old one redirects",
  params: entryParams,
  body: z.object({ slug }),
  response: entryDraft,
});

export const deleteEntry = endpoint({
  method: "DELETE",
  path: "/api/entries/:entry",
  access: "signed_in",
  summary: "Delete a draft that was never public",
  params: entryParams,
  response: done,
});

export const revisionReason = z.enum(["autosave", "publish", "restore"]);

const revisionSummary = z.object({
  number: z.int(),
  title: z.string(),
  reason: revisionReason,
  createdAt: moment,
  /** Words in the document, to tell one from another at a glance. */
  words: z.int(),
});

export type RevisionSummary = z.infer<typeof revisionSummary>;

export const listRevisions = endpoint({
  method: "GET",
  path: "/api/entries/:entry/revisions",
  access: "signed_in",
  summary: "An entry's kept revisions, newest first",
  params: entryParams,
  response: z.object({ revisions: z.array(revisionSummary) }),
});

export const getRevision = endpoint({
  method: "GET",
  path: "/api/entries/:entry/revisions/:revision",
  access: "signed_in",
  summary: "One kept revision",
  params: entryParams.extend({ revision: z.coerce.number().int() }),
  response: revisionSummary.extend({ summary: z.string(), document: documentJson, ...media }),
});

export const restoreRevision = endpoint({
  method: "POST",
  path: "/api/entries/:entry/revisions/:revision/restore",
  access: "signed_in",
  summary: "Make a kept revision the draft again; the present draft is kept as a revision",
  params: entryParams.extend({ revision: z.coerce.number().int() }),
  body: versionBody,
  response: entryDraft,
});

/** One of the builder's own entries in the workshop's list. */
export const workshopEntry = z.object({
  id,
  number: z.int().nullable(),
  slug,
  title: z.string(),
  state: entryState,
  stageId: id,
  updatedAt: moment,
  scheduledAt: moment.nullable(),
  publishedAt: moment.nullable(),
  hasUnpublishedChanges: z.boolean(),
});

export const workshopBuild = buildSummary.extend({
  stages: z.array(stageView),
  entries: z.array(workshopEntry),
  createdAt: moment,
});

export type WorkshopBuild = z.infer<typeof workshopBuild>;

export type WorkshopEntry = z.infer<typeof workshopEntry>;

/** An entry of any of the builder's builds that waits for its time, the soonest first. */
const scheduledEntry = z.object({
  id,
  title: z.string(),
  scheduledAt: moment,
  build: z.object({ slug, title: z.string() }),
});

export type ScheduledEntry = z.infer<typeof scheduledEntry>;

export const listOwnBuilds = endpoint({
  method: "GET",
  path: "/api/workshop",
  access: "signed_in",
  summary: "The viewer's own builds, with entries in every state",
  response: z.object({
    builds: z.array(buildSummary.extend({ draftCount: z.int() })),
    scheduled: z.array(scheduledEntry),
  }),
});

export const getOwnBuild = endpoint({
  method: "GET",
  path: "/api/workshop/builds/:build",
  access: "signed_in",
  summary: "One of the viewer's own builds, with entries in every state",
  params: z.object({ build: slug }),
  response: workshopBuild,
});

export const titleForPublishing = requiredLine("The title", 140);
