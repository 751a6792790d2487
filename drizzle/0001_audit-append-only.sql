CREATE TRIGGER `audit_entry_no_update` BEFORE UPDATE ON `audit_entry` BEGIN SELECT RAISE(ABORT, 'the audit trail is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER `audit_entry_no_delete` BEFORE DELETE ON `audit_entry` BEGIN SELECT RAISE(ABORT, 'the audit trail is append-only'); END;
