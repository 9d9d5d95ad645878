ALTER TABLE `imports` ADD `sheets` text;--> statement-breakpoint
ALTER TABLE `kits` ADD `board_marks` text;--> statement-breakpoint
ALTER TABLE `users` ADD `last_workshop_id` text;