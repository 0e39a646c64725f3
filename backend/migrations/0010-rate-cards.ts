import { migration } from '../src/platform/database/migration';

/** Rate cards: one document for each version, and the day from which it is in force. */
export const rateCards = migration('0010-rate-cards', [
  `CREATE TABLE IF NOT EXISTS rate_cards (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    name VARCHAR(120) NOT NULL,
    in_force_from DATE NULL,
    based_on_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    content JSON NOT NULL,
    changed_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY rate_cards_in_force (workshop_id, in_force_from),
    CONSTRAINT rate_cards_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id),
    CONSTRAINT rate_cards_based_on FOREIGN KEY (workshop_id, based_on_id) REFERENCES rate_cards (workshop_id, id)
  ) ENGINE=InnoDB`,
]);
