import { index, integer, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { users } from "./accounts.ts";
import { builds, entries } from "./builds.ts";

/**
 * A calculator with its inputs and results, kept and numbered in its build. The id is made by the
 * editor when the block is put in, so that a draft can be written without the network.
 */
export const workings = sqliteTable(
  "workings",
  {
    id: text().primaryKey(),
    buildId: text("build_id")
      .notNull()
      .references(() => builds.id),
    entryId: text("entry_id").references(() => entries.id),
    number: integer().notNull(),
    authorId: text("author_id")
      .notNull()
      .references(() => users.id),
    calculator: text().notNull(),
    title: text().notNull(),
    /** The draft's numbers, as JSON, and the calculator version that answered. */
    version: integer().notNull(),
    inputs: text().notNull(),
    results: text().notNull(),
    /** What readers see: JSON of { title, version, inputs, results }, set when the entry is published. */
    published: text(),
    createdAt: integer("created_at").notNull(),
    updatedAt: integer("updated_at").notNull(),
  },
  (t) => [uniqueIndex("workings_number").on(t.buildId, t.number), index("workings_by_entry").on(t.entryId)],
);
