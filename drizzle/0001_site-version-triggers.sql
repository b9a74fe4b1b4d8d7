INSERT INTO `site_version` (`id`, `value`) VALUES (1, 1);
--> statement-breakpoint
CREATE TRIGGER `site_version_users_insert` AFTER INSERT  ON `users` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_users_update` AFTER UPDATE OF name, handle, bio, avatar_photo_id ON `users` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_users_delete` AFTER DELETE  ON `users` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_builds_insert` AFTER INSERT  ON `builds` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_builds_update` AFTER UPDATE OF slug, title, purpose, status, cover_photo_id, cover_alt, published_at, last_entry_at ON `builds` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_builds_delete` AFTER DELETE  ON `builds` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_stages_insert` AFTER INSERT  ON `stages` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_stages_update` AFTER UPDATE  ON `stages` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_stages_delete` AFTER DELETE  ON `stages` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_entries_update` AFTER UPDATE OF state, slug, published_title, published_summary, published_document, published_stage_id, published_photo_id, published_photo_alt, published_at, published_updated_at, deleted_at ON `entries` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_entries_insert` AFTER INSERT  ON `entries` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_entries_delete` AFTER DELETE  ON `entries` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_photos_update` AFTER UPDATE  ON `photos` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_photos_delete` AFTER DELETE  ON `photos` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_workings_update` AFTER UPDATE OF published, number ON `workings` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
--> statement-breakpoint
CREATE TRIGGER `site_version_workings_delete` AFTER DELETE  ON `workings` BEGIN UPDATE `site_version` SET `value` = `value` + 1 WHERE `id` = 1; END;
