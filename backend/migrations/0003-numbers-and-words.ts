import { migration } from '../src/platform/database/migration';

/** Running numbers, and the words that lists are searched by. */
export const numbersAndWords = migration('0003-numbers-and-words', [
  `CREATE TABLE IF NOT EXISTS counters (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    series VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    year INT NOT NULL,
    last BIGINT NOT NULL,
    PRIMARY KEY (workshop_id, series, year),
    CONSTRAINT counters_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS search_words (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    kind VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    word VARCHAR(40) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
    subject_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    PRIMARY KEY (workshop_id, kind, word, subject_id),
    KEY words_of_subject (workshop_id, kind, subject_id, word),
    CONSTRAINT words_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id)
  ) ENGINE=InnoDB`,
]);
