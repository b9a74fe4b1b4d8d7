import { sql } from "drizzle-orm";
import { check, index, integer, primaryKey, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { users } from "./accounts.ts";

export const builds = sqliteTable(
  "builds",
  {
    id: text().primaryKey(),
    ownerId: text("owner_id")
      .notNull()
      .references(() => users.id),
    slug: text().notNull().unique(),
    title: text().notNull(),
    purpose: text().notNull(),
    status: text({ enum: ["planning", "under_way", "paused", "finished", "abandoned"] }).notNull(),
    coverPhotoId: text("cover_photo_id"),
    coverAlt: text("cover_alt").notNull().default(""),
    createdAt: integer("created_at").notNull(),
    updatedAt: integer("updated_at").notNull(),
    /** When its first entry became public; until then only its builder sees the build. */
    publishedAt: integer("published_at"),
    /** When an entry last became public: the order of the list of builds. */
    lastEntryAt: integer("last_entry_at"),
    /** Rises as workings are numbered, so that no number is used twice. */
    lastWorkingNumber: integer("last_working_number").notNull().default(0),
  },
  (t) => [
    index("builds_by_last_entry").on(t.lastEntryAt, t.id),
    index("builds_by_status").on(t.status, t.lastEntryAt, t.id),
    index("builds_by_owner").on(t.ownerId, t.updatedAt),
    index("builds_by_owner_entry").on(t.ownerId, t.lastEntryAt, t.id),
    check("builds_status", sql`${t.status} in ('planning', 'under_way', 'paused', 'finished', 'abandoned')`),
  ],
);

export const stages = sqliteTable(
  "stages",
  {
    id: text().primaryKey(),
    buildId: text("build_id")
      .notNull()
      .references(() => builds.id),
    title: text().notNull(),
    state: text({ enum: ["planned", "under_way", "done", "being_redone"] }).notNull(),
    position: integer().notNull(),
  },
  (t) => [
    index("stages_by_build").on(t.buildId, t.position),
    check("stages_state", sql`${t.state} in ('planned', 'under_way', 'done', 'being_redone')`),
  ],
);

/** Addresses that builds and entries once had. `scope` is the build's id for an entry, '' for a build. */
export const slugRedirects = sqliteTable(
  "slug_redirects",
  {
    kind: text({ enum: ["build", "entry"] }).notNull(),
    scope: text().notNull(),
    slug: text().notNull(),
    targetId: text("target_id").notNull(),
  },
  (t) => [primaryKey({ columns: [t.kind, t.scope, t.slug] })],
);

export const entries = sqliteTable(
  "entries",
  {
    id: text().primaryKey(),
    buildId: text("build_id")
      .notNull()
      .references(() => builds.id),
    stageId: text("stage_id")
      .notNull()
      .references(() => stages.id),
    authorId: text("author_id")
      .notNull()
      .references(() => users.id),
    /** Its place in the series, given when it is first published. */
    number: integer(),
    slug: text().notNull(),
    state: text({ enum: ["draft", "scheduled", "public", "withdrawn"] }).notNull(),
    title: text().notNull(),
    summary: text().notNull(),
    document: text().notNull(),
    version: integer().notNull(),
    /** What readers see; null until first published, kept while withdrawn. */
    publishedTitle: text("published_title"),
    publishedSummary: text("published_summary"),
    publishedDocument: text("published_document"),
    publishedStageId: text("published_stage_id").references(() => stages.id),
    /** The draft version that readers see. */
    publishedVersion: integer("published_version"),
    publishedPhotoId: text("published_photo_id"),
    publishedPhotoAlt: text("published_photo_alt").notNull().default(""),
    publishedAt: integer("published_at"),
    publishedUpdatedAt: integer("published_updated_at"),
    scheduledAt: integer("scheduled_at"),
    createdAt: integer("created_at").notNull(),
    updatedAt: integer("updated_at").notNull(),
    deletedAt: integer("deleted_at"),
  },
  (t) => [
    uniqueIndex("entries_slug").on(t.buildId, t.slug),
    uniqueIndex("entries_number").on(t.buildId, t.number),
    index("entries_by_build").on(t.buildId, t.state, t.number),
    index("entries_by_published").on(t.state, t.publishedAt, t.id),
    index("entries_by_stage").on(t.stageId),
    check("entries_state", sql`${t.state} in ('draft', 'scheduled', 'public', 'withdrawn')`),
  ],
);

export const entryRevisions = sqliteTable(
  "entry_revisions",
  {
    id: text().primaryKey(),
    entryId: text("entry_id")
      .notNull()
      .references(() => entries.id),
    number: integer().notNull(),
    authorId: text("author_id")
      .notNull()
      .references(() => users.id),
    title: text().notNull(),
    summary: text().notNull(),
    document: text().notNull(),
    words: integer().notNull(),
    reason: text({ enum: ["autosave", "publish", "restore"] }).notNull(),
    createdAt: integer("created_at").notNull(),
  },
  (t) => [uniqueIndex("entry_revisions_number").on(t.entryId, t.number)],
);

/** The photos that stand in an entry's public document: what makes a photo visible to readers. */
export const entryPhotos = sqliteTable(
  "entry_photos",
  {
    entryId: text("entry_id")
      .notNull()
      .references(() => entries.id),
    photoId: text("photo_id").notNull(),
  },
  (t) => [primaryKey({ columns: [t.entryId, t.photoId] }), index("entry_photos_by_photo").on(t.photoId)],
);
