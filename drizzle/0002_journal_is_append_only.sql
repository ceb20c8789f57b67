CREATE TRIGGER `journal_no_update` BEFORE UPDATE ON `journal` FOR EACH ROW
SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'The journal is never changed';
--> statement-breakpoint
CREATE TRIGGER `journal_no_delete` BEFORE DELETE ON `journal` FOR EACH ROW
SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'The journal is never deleted from';
