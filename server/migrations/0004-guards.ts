/**
 * The database's own refusals. A ledger row is the only thing that changes a sling's state: the row's trigger
 * writes it, and any other way (whatever account tries) is turned down.
 */
export const name = '0004-guards';

const refuse = (message: string): string => `SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = '${message}';`;

export const up = [
  `CREATE TRIGGER ledger_follows_the_table BEFORE INSERT ON ledger FOR EACH ROW
  BEGIN
    DECLARE now_state VARCHAR(20) CHARACTER SET ascii;
    DECLARE now_condemned BOOLEAN;
    DECLARE now_count INT UNSIGNED;
    DECLARE now_hash CHAR(64) CHARACTER SET ascii;
    SELECT state, condemned, ledger_count, head_hash INTO now_state, now_condemned, now_count, now_hash
      FROM slings WHERE id = NEW.sling_id;
    IF NEW.sling_seq <> now_count + 1 OR NEW.prev_hash <> now_hash THEN
      ${refuse('The ledger row does not follow the head of the chain.')}
    END IF;
    IF (now_count = 0 AND NEW.from_state IS NOT NULL) OR (now_count > 0 AND NOT (NEW.from_state <=> now_state)) THEN
      ${refuse('The ledger row does not start from the state of the sling.')}
    END IF;
    IF NOT EXISTS (
      SELECT 1 FROM lifecycle_transitions
      WHERE type = NEW.type AND from_state = COALESCE(NEW.from_state, '') AND from_condemned = now_condemned
        AND to_state = NEW.to_state AND to_condemned = NEW.condemned
    ) THEN
      ${refuse('The lifecycle table does not hold this change of state.')}
    END IF;
    IF NEW.to_state = 'in_service' AND now_state <> 'in_service' THEN
      IF EXISTS (SELECT 1 FROM hold_reasons WHERE sling_id = NEW.sling_id AND cleared_at IS NULL) THEN
        ${refuse('A reason of a hold is still open.')}
      END IF;
      IF NOT EXISTS (SELECT 1 FROM tags WHERE live_key = NEW.sling_id) THEN
        ${refuse('No label is confirmed on the sling.')}
      END IF;
      IF NOT EXISTS (
        SELECT 1 FROM inspections WHERE sling_id = NEW.sling_id AND verdict = 'pass' AND is_complete
          AND type IN ('initial', 'release')
      ) THEN
        ${refuse('No complete inspection has passed.')}
      END IF;
    END IF;
  END`,
  `CREATE TRIGGER ledger_moves_the_sling AFTER INSERT ON ledger FOR EACH ROW
  BEGIN
    UPDATE slings SET
      state_since = IF(state = NEW.to_state AND condemned = NEW.condemned, state_since, NEW.at),
      condemned_by = IF(NEW.condemned, IF(condemned, condemned_by, NEW.actor_id), NULL),
      custody_since = IF(custody_kind = NEW.custody_kind AND custody_location_id <=> NEW.custody_location_id,
        custody_since, NEW.at),
      last_in_service_seq = IF(NEW.to_state = 'in_service' AND state <> 'in_service', NEW.sling_seq, last_in_service_seq),
      last_sent_seq = IF(NEW.type = 'send', NEW.sling_seq, last_sent_seq),
      came_back_seq = IF(NEW.type = 'receive_back' OR (NEW.to_state = 'returned' AND state <> 'returned'),
        NEW.sling_seq, came_back_seq),
      state = NEW.to_state,
      condemned = NEW.condemned,
      custody_kind = NEW.custody_kind,
      custody_location_id = NEW.custody_location_id,
      ledger_count = NEW.sling_seq,
      head_hash = NEW.hash,
      updated_at = NEW.at
    WHERE id = NEW.sling_id;
    IF NEW.to_state IN ('destroyed', 'departed') THEN
      UPDATE tags SET status = 'void', voided_at = NEW.at, void_reason = NEW.type
        WHERE sling_id = NEW.sling_id AND status <> 'void';
    END IF;
  END`,
  `CREATE TRIGGER ledger_rows_stay BEFORE UPDATE ON ledger FOR EACH ROW
  BEGIN ${refuse('A ledger row is never changed.')} END`,
  `CREATE TRIGGER ledger_rows_are_kept BEFORE DELETE ON ledger FOR EACH ROW
  BEGIN ${refuse('A ledger row is never deleted.')} END`,
  `CREATE TRIGGER slings_start_received BEFORE INSERT ON slings FOR EACH ROW
  BEGIN
    IF NEW.state <> 'received' OR NEW.condemned OR NEW.ledger_count <> 0 OR NEW.head_hash <> REPEAT('0', 64)
      OR NEW.last_in_service_seq IS NOT NULL OR NEW.last_sent_seq IS NOT NULL OR NEW.came_back_seq IS NOT NULL THEN
      ${refuse('A sling starts as received, with an empty ledger.')}
    END IF;
  END`,
  `CREATE TRIGGER slings_move_by_ledger BEFORE UPDATE ON slings FOR EACH ROW
  BEGIN
    IF NEW.id <> OLD.id OR NEW.state <> OLD.state OR NEW.condemned <> OLD.condemned
      OR NOT (NEW.condemned_by <=> OLD.condemned_by) OR NEW.state_since <> OLD.state_since
      OR NEW.custody_kind <> OLD.custody_kind OR NOT (NEW.custody_location_id <=> OLD.custody_location_id)
      OR NEW.custody_since <> OLD.custody_since OR NOT (NEW.last_in_service_seq <=> OLD.last_in_service_seq)
      OR NOT (NEW.last_sent_seq <=> OLD.last_sent_seq) OR NOT (NEW.came_back_seq <=> OLD.came_back_seq)
      OR NEW.ledger_count <> OLD.ledger_count OR NEW.head_hash <> OLD.head_hash THEN
      IF NEW.ledger_count <> OLD.ledger_count + 1 OR NOT EXISTS (
        SELECT 1 FROM ledger WHERE sling_id = NEW.id AND sling_seq = NEW.ledger_count AND hash = NEW.head_hash
          AND to_state = NEW.state AND condemned = NEW.condemned AND custody_kind = NEW.custody_kind
          AND custody_location_id <=> NEW.custody_location_id
      ) THEN
        ${refuse('The state of a sling changes only with a ledger row.')}
      END IF;
    END IF;
  END`,
  `CREATE TRIGGER slings_are_kept BEFORE DELETE ON slings FOR EACH ROW
  BEGIN ${refuse('A sling is never deleted.')} END`,
  `CREATE TRIGGER reasons_are_final BEFORE UPDATE ON hold_reasons FOR EACH ROW
  BEGIN
    IF OLD.cleared_at IS NOT NULL OR NEW.sling_id <> OLD.sling_id OR NEW.code <> OLD.code
      OR NOT (NEW.placed_by <=> OLD.placed_by) OR NEW.placed_seq <> OLD.placed_seq THEN
      ${refuse('A reason of a hold is never rewritten.')}
    END IF;
    IF OLD.confirmed AND NEW.cleared_at IS NOT NULL
      AND NOT EXISTS (SELECT 1 FROM slings WHERE id = OLD.sling_id AND state = 'returned') THEN
      ${refuse('A confirmed reason is not cleared at the counter.')}
    END IF;
    IF OLD.confirmed AND NOT NEW.confirmed AND NEW.withdrawn_seq IS NULL THEN
      ${refuse('A confirmed reason ends only by a withdrawal.')}
    END IF;
  END`,
  `CREATE TRIGGER reasons_are_kept BEFORE DELETE ON hold_reasons FOR EACH ROW
  BEGIN ${refuse('A reason of a hold is never deleted.')} END`,
  `CREATE TRIGGER inspections_stay BEFORE UPDATE ON inspections FOR EACH ROW
  BEGIN ${refuse('An inspection is never changed.')} END`,
  `CREATE TRIGGER inspections_are_kept BEFORE DELETE ON inspections FOR EACH ROW
  BEGIN ${refuse('An inspection is never deleted.')} END`,
  `CREATE TRIGGER tags_only_go_forward BEFORE UPDATE ON tags FOR EACH ROW
  BEGIN
    IF OLD.status = 'void' OR NEW.code <> OLD.code OR NEW.sling_id <> OLD.sling_id
      OR (OLD.status = 'live' AND NEW.status = 'printed') THEN
      ${refuse('A label goes from printed to live to void, never back.')}
    END IF;
  END`,
  `CREATE TRIGGER tags_are_kept BEFORE DELETE ON tags FOR EACH ROW
  BEGIN ${refuse('A label is never deleted.')} END`,
];
