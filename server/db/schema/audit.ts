import { index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";

/** Who did what to which thing, written in the same transaction as the act. */
export const auditLines = sqliteTable(
  "audit_lines",
  {
    id: text().primaryKey(),
    at: integer().notNull(),
    actorId: text("actor_id"),
    action: text().notNull(),
    subjectKind: text("subject_kind").notNull(),
    subjectId: text("subject_id").notNull(),
    detail: text().notNull().default("{}"),
  },
  (t) => [index("audit_lines_by_subject").on(t.subjectKind, t.subjectId, t.at)],
);

/**
 * One row whose value rises whenever something that public pages show changes. Triggers raise it
 * (see the migration), so that no service can forget; the page cache compares it.
 */
export const siteVersion = sqliteTable("site_version", {
  id: integer().primaryKey(),
  value: integer().notNull(),
});
