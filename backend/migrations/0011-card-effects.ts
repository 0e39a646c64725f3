import { migration } from '../src/platform/database/migration';

/** What a rate card would do to the open estimates, as it was worked out last. The id is the card's. */
export const cardEffects = migration('0011-card-effects', [
  `CREATE TABLE IF NOT EXISTS card_effects (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    run_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    card_version INT NOT NULL,
    state VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    worked INT NOT NULL,
    total INT NOT NULL,
    worked_at DATETIME(3) NULL,
    effects JSON NOT NULL,
    PRIMARY KEY (workshop_id, id),
    CONSTRAINT effects_of_card FOREIGN KEY (workshop_id, id) REFERENCES rate_cards (workshop_id, id) ON DELETE CASCADE
  ) ENGINE=InnoDB`,
]);
