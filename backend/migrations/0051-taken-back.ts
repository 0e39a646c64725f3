import { migration } from '../src/platform/database/migration';

/**
 * What the payment service takes back or brings back of a payment stands in a row of its own, with the name of the refund or dispute it
 * follows; and every change of a payment by card is counted, so that an answer asked for before one is not taken for what holds after it.
 */
export const takenBack = migration('0051-taken-back', [
  `ALTER TABLE payments
    ADD COLUMN IF NOT EXISTS deed VARCHAR(16) CHARACTER SET ascii COLLATE ascii_bin NULL,
    ADD COLUMN IF NOT EXISTS follows VARCHAR(120) CHARACTER SET ascii COLLATE ascii_bin NULL,
    ADD KEY IF NOT EXISTS payments_following (workshop_id, follows)`,
  `CREATE OR REPLACE TRIGGER payments_stay BEFORE UPDATE ON payments FOR EACH ROW
    IF NOT (OLD.workshop_id <=> NEW.workshop_id AND OLD.id <=> NEW.id AND OLD.client_id <=> NEW.client_id AND OLD.way <=> NEW.way AND OLD.currency <=> NEW.currency AND OLD.amount_minor <=> NEW.amount_minor AND OLD.received_on <=> NEW.received_on AND OLD.reference <=> NEW.reference AND OLD.refunds_payment_id <=> NEW.refunds_payment_id AND OLD.external_id <=> NEW.external_id AND OLD.recorded_at <=> NEW.recorded_at AND OLD.recorded_by <=> NEW.recorded_by AND OLD.deed <=> NEW.deed AND OLD.follows <=> NEW.follows) THEN
      SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'a payment stays as it was recorded';
    END IF`,
  `ALTER TABLE checkouts ADD COLUMN IF NOT EXISTS turn INT NOT NULL DEFAULT 0`,
]);
