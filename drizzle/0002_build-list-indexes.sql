CREATE INDEX `builds_by_status` ON `builds` (`status`,`last_entry_at`,`id`);--> statement-breakpoint
CREATE INDEX `builds_by_owner_entry` ON `builds` (`owner_id`,`last_entry_at`,`id`);