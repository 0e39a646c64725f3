import { migration } from '../src/platform/database/migration';

/** What a workshop plans with, the programmes of estimates, where their tasks stand, planning on the server, and calendars for other programs. */
export const programme = migration('0045-programme', [
  `CREATE TABLE IF NOT EXISTS shops (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    content JSON NOT NULL,
    changed_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    CONSTRAINT shop_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id),
    CONSTRAINT shop_is_one CHECK (id = workshop_id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS programmes (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    first_day DATE NOT NULL,
    inputs JSON NOT NULL,
    kept LONGBLOB NULL,
    hold_issue_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    hold_until DATE NULL,
    changed_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    CONSTRAINT programme_of_estimate FOREIGN KEY (workshop_id, id) REFERENCES estimates (workshop_id, id) ON DELETE CASCADE,
    CONSTRAINT programme_held_for FOREIGN KEY (workshop_id, hold_issue_id) REFERENCES issues (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS task_marks (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    programme_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    task_id VARCHAR(400) COLLATE utf8mb4_bin NOT NULL,
    started_at DATETIME(3) NOT NULL,
    ended_at DATETIME(3) NULL,
    left_minutes INT NOT NULL,
    person_ids JSON NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY mark_of_task (workshop_id, programme_id, task_id),
    CONSTRAINT marks_of_programme FOREIGN KEY (workshop_id, programme_id) REFERENCES programmes (workshop_id, id) ON DELETE CASCADE
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS programme_solutions (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    programme_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    programme_version INT NOT NULL,
    state VARCHAR(8) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    seconds INT NOT NULL,
    keeps_plan INT NOT NULL,
    is_stopped INT NOT NULL,
    first_day DATE NOT NULL,
    plans INT NOT NULL,
    finish_minutes INT NULL,
    bound_minutes INT NULL,
    best LONGBLOB NULL,
    account_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    name VARCHAR(120) NOT NULL,
    asked_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    KEY solutions_of_programme (workshop_id, programme_id, id),
    CONSTRAINT solutions_of_programme FOREIGN KEY (workshop_id, programme_id) REFERENCES programmes (workshop_id, id) ON DELETE CASCADE
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS calendar_feeds (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    name VARCHAR(80) NOT NULL,
    person_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    secret_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    made_by VARCHAR(120) NOT NULL,
    membership_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    made_at DATETIME(3) NOT NULL,
    revoked_at DATETIME(3) NULL,
    read_at DATETIME(3) NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY feeds_by_secret (secret_hash),
    CONSTRAINT feeds_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id)
  ) ENGINE=InnoDB`,
]);
