CREATE TRIGGER log_no_update BEFORE UPDATE ON log BEGIN SELECT RAISE(ABORT, 'the log is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER log_no_delete BEFORE DELETE ON log BEGIN SELECT RAISE(ABORT, 'the log is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER revision_frozen BEFORE UPDATE OF drawing, content_hash, author_id, editors ON revisions
WHEN old.state <> 'draft' AND (new.drawing IS NOT old.drawing OR new.content_hash IS NOT old.content_hash OR new.author_id IS NOT old.author_id OR new.editors IS NOT old.editors)
BEGIN SELECT RAISE(ABORT, 'a revision that was submitted never changes'); END;
