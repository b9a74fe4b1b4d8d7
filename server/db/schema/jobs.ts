import { sql } from "drizzle-orm";
import { check, index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";

/** The durable queue: at least once, so every handler must bear being run twice. */
export const jobs = sqliteTable(
  "jobs",
  {
    id: text().primaryKey(),
    kind: text().notNull(),
    payload: text().notNull(),
    state: text({ enum: ["queued", "running", "done", "failed"] }).notNull(),
    /** A second job with the same key is not queued while the first waits or runs. */
    uniqueKey: text("unique_key").unique(),
    runAt: integer("run_at").notNull(),
    attempts: integer().notNull().default(0),
    leasedUntil: integer("leased_until"),
    lastError: text("last_error"),
    createdAt: integer("created_at").notNull(),
    finishedAt: integer("finished_at"),
  },
  (t) => [
    index("jobs_due").on(t.state, t.runAt),
    check("jobs_state", sql`${t.state} in ('queued', 'running', 'done', 'failed')`),
  ],
);
