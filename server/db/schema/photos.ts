import { sql } from "drizzle-orm";
import { check, index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { users } from "./accounts.ts";
import { builds } from "./builds.ts";

/**
 * Uploaded photos. Whether one is visible is never stored: it follows from what shows it (a public
 * entry, a published build's cover, an avatar). Files lie under `photos/<id>/` in the uploads folder.
 */
export const photos = sqliteTable(
  "photos",
  {
    id: text().primaryKey(),
    ownerId: text("owner_id")
      .notNull()
      .references(() => users.id),
    buildId: text("build_id").references(() => builds.id),
    purpose: text({ enum: ["entry", "cover", "avatar"] }).notNull(),
    state: text({ enum: ["processing", "ready", "failed"] }).notNull(),
    failure: text(),
    width: integer().notNull(),
    height: integer().notNull(),
    rotation: integer().notNull().default(0),
    /** thumbhash, base64 */
    thumbhash: text(),
    /** JSON lists of the widths on disk for the present rotation. */
    webpWidths: text("webp_widths").notNull().default("[]"),
    avifWidths: text("avif_widths").notNull().default("[]"),
    bytes: integer().notNull(),
    createdAt: integer("created_at").notNull(),
  },
  (t) => [
    index("photos_by_owner").on(t.ownerId, t.createdAt),
    index("photos_by_build").on(t.buildId),
    check("photos_rotation", sql`${t.rotation} in (0, 90, 180, 270)`),
  ],
);
