-- The ledger is only ever appended to. A movement goes only with its supply or its room, and forgets who made it
-- only with that person's account.
CREATE TRIGGER `movements_never_change` BEFORE UPDATE OF `id`, `roomId`, `supplyId`, `act`, `kind`, `delta`, `at`, `why`, `undoes` ON `movements`
BEGIN
	SELECT raise(ABORT, 'movements are only ever appended');
END;
--> statement-breakpoint
CREATE TRIGGER `movements_keep_who` BEFORE UPDATE OF `who` ON `movements`
WHEN NEW.`who` IS NOT NULL OR EXISTS (SELECT 1 FROM `users` WHERE `id` = OLD.`who`)
BEGIN
	SELECT raise(ABORT, 'movements are only ever appended');
END;
--> statement-breakpoint
CREATE TRIGGER `movements_never_go` BEFORE DELETE ON `movements`
WHEN EXISTS (SELECT 1 FROM `supplies` WHERE `id` = OLD.`supplyId`)
	AND EXISTS (SELECT 1 FROM `acts` WHERE `roomId` = OLD.`roomId` AND `id` = OLD.`act`)
BEGIN
	SELECT raise(ABORT, 'movements are only ever appended');
END;
