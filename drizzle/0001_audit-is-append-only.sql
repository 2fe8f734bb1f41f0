CREATE TRIGGER `audit_never_changed` BEFORE UPDATE ON `audit` BEGIN SELECT RAISE(ABORT, 'audit rows are never changed'); END;
--> statement-breakpoint
CREATE TRIGGER `audit_never_deleted` BEFORE DELETE ON `audit` BEGIN SELECT RAISE(ABORT, 'audit rows are never deleted'); END;
