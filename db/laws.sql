-- The laws of the data (triggers). Dropped and created anew after every migration, because a rebuilt table loses its triggers.
-- Each refusal begins with "law:" so that a broken rule can be told from a broken database.

CREATE TRIGGER revision_without_gaps BEFORE INSERT ON revision
WHEN NEW.number <> (SELECT coalesce(max(number), 0) + 1 FROM revision WHERE post_id = NEW.post_id)
BEGIN SELECT raise(ABORT, 'law: revisions are numbered without gaps'); END;

-- The one door: a steward may redact, once, keeping the hash of what stood there.
CREATE TRIGGER revision_never_changes BEFORE UPDATE ON revision
WHEN NOT (OLD.redacted_reason IS NULL AND NEW.redacted_reason IS NOT NULL AND NEW.content_hash = OLD.content_hash
          AND NEW.post_id = OLD.post_id AND NEW.number = OLD.number AND NEW.created_at = OLD.created_at
          AND NEW.author_id IS OLD.author_id)
BEGIN SELECT raise(ABORT, 'law: a revision never changes'); END;

-- What was made of a text goes with it.
CREATE TRIGGER redaction_takes_all AFTER UPDATE ON revision
BEGIN
  DELETE FROM rendering WHERE key = 'post:' || NEW.post_id || ':' || NEW.number;
  DELETE FROM measurement WHERE post_id = NEW.post_id AND NEW.number = (SELECT current_revision FROM post WHERE id = NEW.post_id);
END;

CREATE TRIGGER revision_never_deleted BEFORE DELETE ON revision
BEGIN SELECT raise(ABORT, 'law: a revision is never deleted'); END;

CREATE TRIGGER post_never_deleted BEFORE DELETE ON post
BEGIN SELECT raise(ABORT, 'law: a post is hidden, never deleted'); END;

CREATE TRIGGER post_keeps_its_place BEFORE UPDATE OF kind, parent_id, author_id, created_at ON post
WHEN NEW.kind <> OLD.kind OR NEW.parent_id IS NOT OLD.parent_id OR NEW.author_id IS NOT OLD.author_id OR NEW.created_at <> OLD.created_at
BEGIN SELECT raise(ABORT, 'law: a post keeps its kind, parent and author'); END;

CREATE TRIGGER post_answers_a_question BEFORE INSERT ON post
WHEN NEW.parent_id IS NOT NULL AND (SELECT kind FROM post WHERE id = NEW.parent_id) IS NOT 'question'
BEGIN SELECT raise(ABORT, 'law: only a question has answers'); END;

CREATE TRIGGER stamp_not_on_own_words BEFORE INSERT ON stamp
WHEN NEW.mentor_id IS NOT NULL AND EXISTS (SELECT 1 FROM revision WHERE post_id = NEW.post_id AND author_id = NEW.mentor_id)
BEGIN SELECT raise(ABORT, 'law: nobody stamps their own words'); END;

CREATE TRIGGER stamp_not_on_a_question BEFORE INSERT ON stamp
WHEN (SELECT kind FROM post WHERE id = NEW.post_id) = 'question'
BEGIN SELECT raise(ABORT, 'law: a question is answered, not stamped'); END;

CREATE TRIGGER stamp_only_by_a_mentor BEFORE INSERT ON stamp
WHEN NEW.mentor_id IS NOT NULL AND NOT EXISTS
  (SELECT 1 FROM mentorship WHERE member_id = NEW.mentor_id AND number = NEW.mark AND created_at <= NEW.created_at
   AND (ended_at IS NULL OR ended_at > NEW.created_at))
BEGIN SELECT raise(ABORT, 'law: only those to whom mentorship was granted stamp'); END;

CREATE TRIGGER stamp_not_for_one_serial BEFORE INSERT ON stamp
WHEN NEW.scope = 'one-serial'
  OR (SELECT maker_reply_scope FROM revision WHERE post_id = NEW.post_id AND number = NEW.revision) = 'one-serial'
BEGIN SELECT raise(ABORT, 'law: a reply for one serial cannot be stamped'); END;

CREATE TRIGGER stamp_names_the_questions_revision BEFORE INSERT ON stamp
WHEN (SELECT parent_id FROM post WHERE id = NEW.post_id) IS NOT NULL
  AND NOT EXISTS (SELECT 1 FROM revision WHERE number = NEW.question_revision
                  AND post_id = (SELECT parent_id FROM post WHERE id = NEW.post_id))
BEGIN SELECT raise(ABORT, 'law: a stamp on an answer names the revision of its question'); END;

CREATE TRIGGER stamp_only_withdrawn BEFORE UPDATE ON stamp
WHEN NOT (OLD.withdrawn_at IS NULL AND NEW.withdrawn_at IS NOT NULL AND NEW.withdrawn_reason IS NOT NULL
  AND NEW.post_id = OLD.post_id AND NEW.revision = OLD.revision AND NEW.question_revision IS OLD.question_revision
  AND NEW.mentor_id IS OLD.mentor_id AND NEW.mark = OLD.mark AND NEW.basis = OLD.basis AND NEW.reference = OLD.reference
  AND NEW.plans_revision IS OLD.plans_revision AND NEW.scope IS OLD.scope AND NEW.created_at = OLD.created_at)
BEGIN SELECT raise(ABORT, 'law: a stamp can only be withdrawn'); END;

CREATE TRIGGER stamp_never_deleted BEFORE DELETE ON stamp
BEGIN SELECT raise(ABORT, 'law: a stamp is withdrawn, never deleted'); END;

CREATE TRIGGER outcome_not_on_own_words BEFORE INSERT ON outcome
WHEN EXISTS (SELECT 1 FROM revision WHERE post_id = NEW.post_id AND author_id = NEW.member_id)
  OR (SELECT kind FROM post WHERE id = NEW.post_id) = 'question'
BEGIN SELECT raise(ABORT, 'law: how it went is told of what somebody else advised'); END;

CREATE TRIGGER reliance_not_on_own_words BEFORE INSERT ON reliance
WHEN EXISTS (SELECT 1 FROM revision WHERE post_id = NEW.post_id AND author_id = NEW.member_id)
  OR (SELECT kind FROM post WHERE id = NEW.post_id) = 'question'
  OR (SELECT maker_reply_scope FROM revision WHERE post_id = NEW.post_id AND number = NEW.revision) = 'one-serial'
BEGIN SELECT raise(ABORT, 'law: one goes by what somebody else advised, and never by a reply for one serial'); END;

CREATE TRIGGER caution_stays BEFORE DELETE ON post_caution
BEGIN SELECT raise(ABORT, 'law: a caution stays until waived'); END;

CREATE TRIGGER caution_only_waived BEFORE UPDATE ON post_caution
WHEN NEW.post_id <> OLD.post_id OR NEW.code <> OLD.code OR NEW.created_at <> OLD.created_at
BEGIN SELECT raise(ABORT, 'law: a caution can only be acknowledged, waived or required again'); END;

CREATE TRIGGER last_steward_stays BEFORE UPDATE OF role, state ON member
WHEN OLD.role = 'steward' AND OLD.state = 'active' AND (NEW.role <> 'steward' OR NEW.state <> 'active')
  AND NOT EXISTS (SELECT 1 FROM member WHERE role = 'steward' AND state = 'active' AND id <> OLD.id)
BEGIN SELECT raise(ABORT, 'law: the last steward cannot be demoted'); END;

CREATE TRIGGER audit_is_chained BEFORE INSERT ON audit
WHEN NEW.previous_hash <> coalesce((SELECT hash FROM audit ORDER BY sequence DESC LIMIT 1), '')
BEGIN SELECT raise(ABORT, 'law: each audit row holds the hash of the one before'); END;

CREATE TRIGGER audit_never_changes BEFORE UPDATE ON audit
BEGIN SELECT raise(ABORT, 'law: the audit trail is append-only'); END;

CREATE TRIGGER audit_never_deleted BEFORE DELETE ON audit
BEGIN SELECT raise(ABORT, 'law: the audit trail is append-only'); END;

CREATE TRIGGER limit_only_ended BEFORE UPDATE ON kit_limit
WHEN NOT (OLD.ended_at IS NULL AND NEW.ended_at IS NOT NULL AND NEW.end_reason IS NOT NULL
  AND NEW.kit_id = OLD.kit_id AND NEW.shop_table = OLD.shop_table AND NEW.result = OLD.result AND NEW.inputs = OLD.inputs AND NEW.value = OLD.value
  AND NEW.unit = OLD.unit AND NEW.display = OLD.display AND NEW.reference = OLD.reference AND NEW.note = OLD.note AND NEW.created_at = OLD.created_at)
BEGIN SELECT raise(ABORT, 'law: a limit can only be ended'); END;

CREATE TRIGGER limit_never_deleted BEFORE DELETE ON kit_limit
BEGIN SELECT raise(ABORT, 'law: a limit is ended, never deleted'); END;

-- The change log. An answer's change is its question's: search shows one hit an entry.
CREATE TRIGGER change_post_inserted AFTER INSERT ON post
BEGIN INSERT INTO change (post_id) VALUES (coalesce(NEW.parent_id, NEW.id)); END;

-- Every column but measured_by: finding a post's measurements anew is no change that others see.
CREATE TRIGGER change_post_updated AFTER UPDATE OF
  id, kind, parent_id, author_id, author_name, ref, state, state_reason, merged_into_id, state_by, state_at, current_revision, stamp_state, needs_two, created_at, updated_at ON post
BEGIN INSERT INTO change (post_id) VALUES (coalesce(NEW.parent_id, NEW.id)); END;

CREATE TRIGGER change_revision AFTER UPDATE ON revision
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_stamp_inserted AFTER INSERT ON stamp
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_stamp_updated AFTER UPDATE ON stamp
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_caution_inserted AFTER INSERT ON post_caution
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_caution_updated AFTER UPDATE ON post_caution
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_remark_inserted AFTER INSERT ON remark
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_remark_updated AFTER UPDATE ON remark
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_outcome_inserted AFTER INSERT ON outcome
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_outcome_updated AFTER UPDATE ON outcome
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_reliance_inserted AFTER INSERT ON reliance
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = NEW.post_id; END;

CREATE TRIGGER change_reliance_deleted AFTER DELETE ON reliance
BEGIN INSERT INTO change (post_id) SELECT coalesce(parent_id, id) FROM post WHERE id = OLD.post_id; END;
