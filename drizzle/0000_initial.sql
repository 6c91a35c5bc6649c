CREATE TABLE `acts` (
	`id` text NOT NULL,
	`roomId` text NOT NULL,
	`kind` text NOT NULL,
	`who` text,
	`at` integer NOT NULL,
	`projectId` text,
	`changes` text DEFAULT '[]' NOT NULL,
	`undoes` text,
	PRIMARY KEY(`roomId`, `id`),
	FOREIGN KEY (`roomId`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`who`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`projectId`) REFERENCES `projects`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "acts_kind" CHECK("acts"."kind" in ('add', 'edit', 'recount', 'move', 'trash', 'restore', 'use', 'cut', 'import', 'undo'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `acts_undoes` ON `acts` (`roomId`,`undoes`);--> statement-breakpoint
CREATE INDEX `acts_project` ON `acts` (`projectId`);--> statement-breakpoint
CREATE TABLE `movements` (
	`id` text PRIMARY KEY NOT NULL,
	`roomId` text NOT NULL,
	`supplyId` text NOT NULL,
	`act` text NOT NULL,
	`kind` text NOT NULL,
	`delta` integer NOT NULL,
	`who` text,
	`at` integer NOT NULL,
	`why` text,
	`undoes` text,
	FOREIGN KEY (`supplyId`) REFERENCES `supplies`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`who`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`undoes`) REFERENCES `movements`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`roomId`,`act`) REFERENCES `acts`(`roomId`,`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "movements_kind" CHECK("movements"."kind" in ('bought', 'counted', 'cut', 'used', 'spoiled', 'offcut-in', 'offcut-out', 'lent', 'returned', 'passed-on'))
);
--> statement-breakpoint
CREATE INDEX `movements_supply` ON `movements` (`supplyId`,`id`);--> statement-breakpoint
CREATE INDEX `movements_act` ON `movements` (`roomId`,`act`);--> statement-breakpoint
CREATE UNIQUE INDEX `movements_undoes` ON `movements` (`undoes`);--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` text PRIMARY KEY NOT NULL,
	`messageId` text NOT NULL,
	`recipient` text NOT NULL,
	`subject` text NOT NULL,
	`body` text NOT NULL,
	`createdAt` integer NOT NULL,
	`tries` integer DEFAULT 0 NOT NULL,
	`nextTryAt` integer,
	`sentAt` integer,
	`deadAt` integer,
	`lastError` text
);
--> statement-breakpoint
CREATE UNIQUE INDEX `outbox_messageId_unique` ON `outbox` (`messageId`);--> statement-breakpoint
CREATE INDEX `outbox_due` ON `outbox` (`nextTryAt`);--> statement-breakpoint
CREATE TABLE `attempts` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`account` text NOT NULL,
	`network` text NOT NULL,
	`at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `attempts_account` ON `attempts` (`kind`,`account`,`at`);--> statement-breakpoint
CREATE INDEX `attempts_network` ON `attempts` (`kind`,`network`,`at`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`secretHash` text NOT NULL,
	`userId` text NOT NULL,
	`roomId` text,
	`userAgent` text NOT NULL,
	`address` text NOT NULL,
	`createdAt` integer NOT NULL,
	`seenAt` integer NOT NULL,
	`endedAt` integer,
	FOREIGN KEY (`userId`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`roomId`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sessions_secretHash_unique` ON `sessions` (`secretHash`);--> statement-breakpoint
CREATE INDEX `sessions_user` ON `sessions` (`userId`);--> statement-breakpoint
CREATE TABLE `tokens` (
	`hash` text PRIMARY KEY NOT NULL,
	`purpose` text NOT NULL,
	`email` text NOT NULL,
	`signUp` text,
	`createdAt` integer NOT NULL,
	`expiresAt` integer NOT NULL,
	`usedAt` integer,
	CONSTRAINT "tokens_purpose" CHECK("tokens"."purpose" in ('sign-up', 'link', 'reset'))
);
--> statement-breakpoint
CREATE INDEX `tokens_email` ON `tokens` (`email`,`purpose`);--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`passwordHash` text,
	`siteRole` text DEFAULT 'none' NOT NULL,
	`createdAt` integer NOT NULL,
	`disabledAt` integer,
	CONSTRAINT "users_email" CHECK("users"."email" = lower("users"."email")),
	CONSTRAINT "users_site_role" CHECK("users"."siteRole" in ('none', 'moderator', 'admin'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email_unique` ON `users` (`email`);--> statement-breakpoint
CREATE TABLE `projects` (
	`id` text PRIMARY KEY NOT NULL,
	`roomId` text NOT NULL,
	`key` text NOT NULL,
	`name` text NOT NULL,
	`bill` text NOT NULL,
	`copies` integer DEFAULT 1 NOT NULL,
	`position` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`createdAt` integer NOT NULL,
	`updatedAt` integer NOT NULL,
	`deletedAt` integer,
	FOREIGN KEY (`roomId`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "projects_name" CHECK(length(trim("projects"."name")) > 0),
	CONSTRAINT "projects_copies" CHECK("projects"."copies" between 1 and 1000)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `projects_room_key` ON `projects` (`roomId`,`key`);--> statement-breakpoint
CREATE INDEX `projects_room_position` ON `projects` (`roomId`,`deletedAt`,`position`);--> statement-breakpoint
CREATE TABLE `invitations` (
	`id` text PRIMARY KEY NOT NULL,
	`hash` text NOT NULL,
	`roomId` text NOT NULL,
	`role` text NOT NULL,
	`createdBy` text NOT NULL,
	`createdAt` integer NOT NULL,
	`expiresAt` integer NOT NULL,
	`usedAt` integer,
	`revokedAt` integer,
	FOREIGN KEY (`roomId`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`createdBy`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "invitations_role" CHECK("invitations"."role" in ('owner', 'member', 'viewer'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_hash_unique` ON `invitations` (`hash`);--> statement-breakpoint
CREATE INDEX `invitations_room` ON `invitations` (`roomId`);--> statement-breakpoint
CREATE TABLE `memberships` (
	`roomId` text NOT NULL,
	`userId` text NOT NULL,
	`role` text NOT NULL,
	`joinedAt` integer NOT NULL,
	PRIMARY KEY(`roomId`, `userId`),
	FOREIGN KEY (`roomId`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`userId`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "memberships_role" CHECK("memberships"."role" in ('owner', 'member', 'viewer'))
);
--> statement-breakpoint
CREATE INDEX `memberships_user` ON `memberships` (`userId`);--> statement-breakpoint
CREATE TABLE `rooms` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`units` text DEFAULT 'in' NOT NULL,
	`reach` integer,
	`keepOffcut` integer,
	`currency` text DEFAULT 'USD' NOT NULL,
	`pricesShown` integer DEFAULT false NOT NULL,
	`revision` integer DEFAULT 0 NOT NULL,
	`setUp` integer DEFAULT false NOT NULL,
	`createdAt` integer NOT NULL,
	CONSTRAINT "rooms_units" CHECK("rooms"."units" in ('in', 'mm', 'cm')),
	CONSTRAINT "rooms_reach" CHECK("rooms"."reach" > 0),
	CONSTRAINT "rooms_keep_offcut" CHECK("rooms"."keepOffcut" > 0),
	CONSTRAINT "rooms_currency" CHECK(length("rooms"."currency") = 3)
);
--> statement-breakpoint
CREATE TABLE `bins` (
	`id` text PRIMARY KEY NOT NULL,
	`roomId` text NOT NULL,
	`name` text NOT NULL,
	FOREIGN KEY (`roomId`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "bins_name" CHECK(length(trim("bins"."name")) > 0)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `bins_room_name` ON `bins` (`roomId`,`name`);--> statement-breakpoint
CREATE TABLE `supplies` (
	`id` text PRIMARY KEY NOT NULL,
	`roomId` text NOT NULL,
	`key` text NOT NULL,
	`group` text NOT NULL,
	`kind` text NOT NULL,
	`name` text NOT NULL,
	`collection` text,
	`w` integer,
	`h` integer,
	`unit` text,
	`entered` text,
	`amount` integer DEFAULT 0 NOT NULL,
	`count` text DEFAULT 'counted' NOT NULL,
	`faces` text DEFAULT '[]' NOT NULL,
	`weightText` text,
	`gsm` real,
	`caliper` integer,
	`colours` text DEFAULT '[]' NOT NULL,
	`offcut` integer DEFAULT false NOT NULL,
	`stripEdge` text,
	`stripDepth` integer,
	`width` integer,
	`full` integer,
	`reach` integer,
	`grooves` integer,
	`shape` text,
	`size` integer,
	`cuts` text DEFAULT '[]' NOT NULL,
	`priceAmount` integer,
	`priceCurrency` text,
	`barcode` text,
	`binId` text,
	`arrives` text,
	`lentUntil` text,
	`borrowedUntil` text,
	`picture` text,
	`version` integer DEFAULT 1 NOT NULL,
	`createdAt` integer NOT NULL,
	`deletedAt` integer,
	FOREIGN KEY (`roomId`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`binId`) REFERENCES `bins`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "supplies_amount" CHECK("supplies"."amount" >= 0),
	CONSTRAINT "supplies_name" CHECK(length(trim("supplies"."name")) > 0),
	CONSTRAINT "supplies_kind" CHECK(("supplies"."group" = 'sheet' and "supplies"."kind" in ('patterned-paper', 'cardstock', 'chipboard', 'vellum', 'plain-paper', 'kraft-paper', 'watercolour-paper', 'mulberry-paper', 'metallic-paper', 'glitter-paper', 'acetate', 'book-cloth', 'felt', 'magnet-sheet', 'adhesive-sheet')) or ("supplies"."group" = 'consumable' and "supplies"."kind" in ('tape', 'foam-tape', 'washi-tape', 'runner', 'ribbon', 'elastic', 'twine', 'glue', 'spray-adhesive', 'ink', 'glue-stick', 'glue-dots', 'foam-squares', 'magnets', 'brads', 'eyelets', 'rings', 'closures', 'envelopes', 'embellishments')) or ("supplies"."group" = 'tool' and "supplies"."kind" in ('trimmer', 'guillotine-cutter', 'rotary-cutter', 'craft-knife', 'scissors', 'ruler', 'cutting-mat', 'scoring-board', 'scoring-tool', 'bone-folder', 'corner-punch', 'edge-punch', 'shape-punch', 'hole-punch', 'tab-punch', 'die-cutter', 'die', 'embossing-folder', 'eyelet-setter', 'heat-tool', 'glue-gun', 'stapler', 'awl', 'brush', 'stamp'))),
	CONSTRAINT "supplies_count" CHECK("supplies"."count" in ('counted', 'unsure')),
	CONSTRAINT "supplies_sheet_size" CHECK(("supplies"."group" = 'sheet') = ("supplies"."w" is not null) and ("supplies"."group" = 'sheet') = ("supplies"."h" is not null) and ifnull("supplies"."w", 1) > 0 and ifnull("supplies"."h", 1) > 0),
	CONSTRAINT "supplies_one_tool" CHECK("supplies"."group" <> 'tool' or "supplies"."amount" <= 1),
	CONSTRAINT "supplies_measures" CHECK(ifnull("supplies"."width", 1) > 0 and ifnull("supplies"."full", 1) > 0 and ifnull("supplies"."reach", 1) > 0 and ifnull("supplies"."grooves", 1) > 0 and ifnull("supplies"."size", 1) > 0 and ifnull("supplies"."caliper", 1) > 0 and ifnull("supplies"."gsm", 1) > 0),
	CONSTRAINT "supplies_strip" CHECK(("supplies"."stripEdge" is null) = ("supplies"."stripDepth" is null) and ifnull("supplies"."stripEdge", 'top') in ('top', 'bottom', 'left', 'right') and ifnull("supplies"."stripDepth", 1) > 0),
	CONSTRAINT "supplies_price" CHECK(("supplies"."priceAmount" is null) = ("supplies"."priceCurrency" is null) and ifnull("supplies"."priceAmount", 0) >= 0),
	CONSTRAINT "supplies_weight" CHECK(("supplies"."weightText" is null) = ("supplies"."gsm" is null))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `supplies_room_key` ON `supplies` (`roomId`,`key`);--> statement-breakpoint
CREATE INDEX `supplies_room_name` ON `supplies` (`roomId`,`deletedAt`,`name`);--> statement-breakpoint
CREATE INDEX `supplies_room_kind` ON `supplies` (`roomId`,`deletedAt`,`kind`);--> statement-breakpoint
CREATE INDEX `supplies_bin` ON `supplies` (`binId`);--> statement-breakpoint
CREATE INDEX `supplies_room_barcode` ON `supplies` (`roomId`,`barcode`);