-- History is added to, never rewritten: not by the application, not by a hand on the console in a hurry.
CREATE TRIGGER `audit_events_refuse_update` BEFORE UPDATE ON `audit_events` FOR EACH ROW
  SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'Audit events are append-only: they are never altered.';
--> statement-breakpoint
CREATE TRIGGER `audit_events_refuse_delete` BEFORE DELETE ON `audit_events` FOR EACH ROW
  SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'Audit events are append-only: they are never removed.';
