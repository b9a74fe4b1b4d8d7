import { z } from "zod";
import { done, id, moment, pageOf, pageQuery, requiredLine, slug } from "./common.ts";
import { endpoint } from "./endpoint.ts";
import { personSummary } from "./people.ts";
import { photoView } from "./photos.ts";

export const buildStatus = z.enum(["planning", "under_way", "paused", "finished", "abandoned"]);
export const stageState = z.enum(["planned", "under_way", "done", "being_redone"]);

export type BuildStatus = z.infer<typeof buildStatus>;
export type StageState = z.infer<typeof stageState>;

/** A build as a card in a list shows it. */
export const buildSummary = z.object({
  id,
  slug,
  title: z.string(),
  purpose: z.string(),
  status: buildStatus,
  cover: photoView.nullable(),
  coverAlt: z.string(),
  owner: personSummary,
  entryCount: z.int(),
  /** When an entry last became public; null while there is none. */
  lastEntryAt: moment.nullable(),
});

export type BuildSummary = z.infer<typeof buildSummary>;

/** A part of a build in the maker's own order. */
export const stageView = z.object({ id, title: z.string(), state: stageState, entryCount: z.int() });

export type StageView = z.infer<typeof stageView>;

/** An entry as a list, a time line or a "next" link shows it. */
export const entrySummary = z.object({
  id,
  number: z.int(),
  slug,
  title: z.string(),
  summary: z.string(),
  stageId: id,
  publishedAt: moment,
  /** The first photo of the entry. */
  photo: photoView.nullable(),
  photoAlt: z.string(),
});

export type EntrySummary = z.infer<typeof entrySummary>;

/** A build's page: itself, its stages in order and its public entries, oldest first. */
export const buildPage = buildSummary.extend({
  createdAt: moment,
  stages: z.array(stageView),
  entries: z.array(entrySummary),
  /** True when the viewer may edit this build. */
  mine: z.boolean(),
});

export type BuildPage = z.infer<typeof buildPage>;

const buildParams = z.object({ build: slug });
const stageParams = z.object({ stage: id });

export const listBuilds = endpoint({
  method: "GET",
  path: "/api/builds",
  access: "anyone",
  summary: "Public builds, the most recently written in first",
  query: pageQuery.extend({ owner: slug.optional(), status: buildStatus.optional() }),
  response: pageOf(buildSummary),
});

export const latestEntries = endpoint({
  method: "GET",
  path: "/api/entries",
  access: "anyone",
  summary: "Public entries of all builds, newest first",
  query: pageQuery,
  response: pageOf(entrySummary.extend({ build: buildSummary })),
});

/** A slug that was renamed answers with the present one in `slug`: compare, and redirect. */
export const getBuild = endpoint({
  method: "GET",
  path: "/api/builds/:build",
  access: "anyone",
  summary: "A build's page",
  params: buildParams,
  response: buildPage,
});

export const createBuildBody = z.object({
  title: requiredLine("The title", 100),
  purpose: requiredLine("The purpose line", 200),
  status: buildStatus.default("planning"),
});

export type CreateBuildBody = z.infer<typeof createBuildBody>;

export const createBuild = endpoint({
  method: "POST",
  path: "/api/builds",
  access: "verified",
  summary: "Start a build",
  body: createBuildBody,
  response: buildPage,
  status: 201,
});

export const updateBuildBody = createBuildBody.partial().extend({
  status: buildStatus.optional(),
  slug: slug.optional(),
  coverPhotoId: id.nullable().optional(),
  coverAlt: z
    .string()
    .trim()
    .max(300, "The description of the cover may be at most 300 characters.")
    .optional(),
});

export type UpdateBuildBody = z.infer<typeof updateBuildBody>;

export const updateBuild = endpoint({
  method: "PATCH",
  path: "/api/builds/:build",
  access: "signed_in",
  summary: "Change a build of one's own",
  params: buildParams,
  body: updateBuildBody,
  response: buildPage,
});

const stageTitle = requiredLine("The stage's name", 80);

export const createStage = endpoint({
  method: "POST",
  path: "/api/builds/:build/stages",
  access: "signed_in",
  summary: "Add a stage at the end",
  params: buildParams,
  body: z.object({ title: stageTitle, state: stageState.default("planned") }),
  response: stageView,
  status: 201,
});

export const updateStage = endpoint({
  method: "PATCH",
  path: "/api/stages/:stage",
  access: "signed_in",
  summary: "Rename a stage or change its state",
  params: stageParams,
  body: z.object({ title: stageTitle.optional(), state: stageState.optional() }),
  response: stageView,
});

export const deleteStage = endpoint({
  method: "DELETE",
  path: "/api/stages/:stage",
  access: "signed_in",
  summary: "Delete a stage that holds no entry",
  params: stageParams,
  response: done,
});

export const orderStages = endpoint({
  method: "PUT",
  path: "/api/builds/:build/stages/order",
  access: "signed_in",
  summary: "Put the stages in this order",
  params: buildParams,
  body: z.object({ stages: z.array(id).min(1).max(200) }),
  response: z.object({ stages: z.array(stageView) }),
});
