PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE `__new_imports` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`kit_id` text,
	`kind` text NOT NULL,
	`state` text NOT NULL,
	`file_name` text NOT NULL,
	`byte_length` integer NOT NULL,
	`encoding` text NOT NULL,
	`content_hash` text NOT NULL,
	`content` text NOT NULL,
	`row_count` integer NOT NULL,
	`supplier_id` text,
	`supplier_name` text,
	`mapping` text,
	`answers` text NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`taken_at` integer,
	`taken_by` text,
	`outcome` text,
	`before` text,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshops`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`kit_id`) REFERENCES `kits`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "kind_rule" CHECK("__new_imports"."kind" is null or ("__new_imports"."kind" in ('parts-list', 'price-list'))),
	CONSTRAINT "state_rule" CHECK("__new_imports"."state" is null or ("__new_imports"."state" in ('draft', 'taken', 'taken-back', 'dropped'))),
	CONSTRAINT "byte_length_rule" CHECK("__new_imports"."byte_length" is null or (typeof("__new_imports"."byte_length") = 'integer' and "__new_imports"."byte_length" >= 0)),
	CONSTRAINT "row_count_rule" CHECK("__new_imports"."row_count" is null or (typeof("__new_imports"."row_count") = 'integer' and "__new_imports"."row_count" >= 0))
);
--> statement-breakpoint
INSERT INTO `__new_imports`("id", "workshop_id", "kit_id", "kind", "state", "file_name", "byte_length", "encoding", "content_hash", "content", "row_count", "supplier_id", "supplier_name", "mapping", "answers", "created_by", "created_at", "taken_at", "taken_by", "outcome", "before", "version") SELECT "id", "workshop_id", "kit_id", "kind", "state", "file_name", "byte_length", "encoding", "content_hash", "content", 0, "supplier_id", null, "mapping", "answers", "created_by", "created_at", "taken_at", null, null, "before", "version" FROM `imports`;--> statement-breakpoint
DROP TABLE `imports`;--> statement-breakpoint
ALTER TABLE `__new_imports` RENAME TO `imports`;--> statement-breakpoint
PRAGMA foreign_keys=ON;--> statement-breakpoint
CREATE INDEX `imports_workshop` ON `imports` (`workshop_id`,`created_at`);--> statement-breakpoint
CREATE INDEX `imports_kit` ON `imports` (`kit_id`,`created_at`);