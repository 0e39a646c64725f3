import { migration } from '../src/platform/database/migration';

/** Estimates with their pieces and members as rows, what readers are sent, issues, and who is at work. */
export const estimates = migration('0030-estimates', [
  `CREATE TABLE IF NOT EXISTS estimates (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    job_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    number VARCHAR(40) NOT NULL,
    version INT NOT NULL,
    rate_card_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    currency CHAR(3) NOT NULL,
    settings JSON NOT NULL,
    settings_version INT NOT NULL,
    members INT NOT NULL,
    letter VARCHAR(8) NULL,
    changed_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY estimates_number (workshop_id, number),
    KEY estimates_of_job (workshop_id, job_id, id),
    KEY estimates_on_card (workshop_id, rate_card_id),
    CONSTRAINT estimates_of_job FOREIGN KEY (workshop_id, job_id) REFERENCES jobs (workshop_id, id),
    CONSTRAINT estimates_on_card FOREIGN KEY (workshop_id, rate_card_id) REFERENCES rate_cards (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS pieces (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    estimate_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    content JSON NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY pieces_of_estimate (workshop_id, estimate_id, id),
    CONSTRAINT pieces_of_estimate FOREIGN KEY (workshop_id, estimate_id) REFERENCES estimates (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS members (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    estimate_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    piece_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    content JSON NOT NULL,
    PRIMARY KEY (workshop_id, id),
    KEY members_of_piece (workshop_id, estimate_id, piece_id),
    CONSTRAINT members_of_piece FOREIGN KEY (workshop_id, estimate_id, piece_id) REFERENCES pieces (workshop_id, estimate_id, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS estimate_readings (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    audience VARCHAR(8) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    calculator_version INT NOT NULL,
    bytes LONGBLOB NOT NULL,
    PRIMARY KEY (workshop_id, id, audience),
    CONSTRAINT readings_of_estimate FOREIGN KEY (workshop_id, id) REFERENCES estimates (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS issues (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    estimate_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    sequence INT NOT NULL,
    letter VARCHAR(8) NOT NULL,
    state VARCHAR(10) NOT NULL,
    issued_at DATETIME(3) NOT NULL,
    issued_by VARCHAR(120) NOT NULL,
    note VARCHAR(1000) NOT NULL,
    valid_until DATE NOT NULL,
    leaf_valid_until DATE NOT NULL,
    marked_on DATE NULL,
    mark_note VARCHAR(1000) NOT NULL,
    net_minor BIGINT NOT NULL,
    tax_minor BIGINT NOT NULL,
    gross_minor BIGINT NOT NULL,
    calculator_version INT NOT NULL,
    snapshot LONGBLOB NOT NULL,
    sha256 CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY issues_of_estimate (workshop_id, estimate_id, sequence),
    CONSTRAINT issues_of_estimate FOREIGN KEY (workshop_id, estimate_id) REFERENCES estimates (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE OR REPLACE TRIGGER issues_stay_as_issued BEFORE UPDATE ON issues FOR EACH ROW
    IF NOT (OLD.workshop_id <=> NEW.workshop_id AND OLD.id <=> NEW.id AND OLD.estimate_id <=> NEW.estimate_id AND OLD.sequence <=> NEW.sequence AND OLD.letter <=> NEW.letter AND OLD.issued_at <=> NEW.issued_at AND OLD.issued_by <=> NEW.issued_by AND OLD.note <=> NEW.note AND OLD.valid_until <=> NEW.valid_until AND OLD.leaf_valid_until <=> NEW.leaf_valid_until AND OLD.net_minor <=> NEW.net_minor AND OLD.tax_minor <=> NEW.tax_minor AND OLD.gross_minor <=> NEW.gross_minor AND OLD.calculator_version <=> NEW.calculator_version AND OLD.snapshot <=> NEW.snapshot AND OLD.sha256 <=> NEW.sha256) THEN
      SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'an issue stays as it was issued';
    END IF`,
  `CREATE OR REPLACE TRIGGER issues_are_kept BEFORE DELETE ON issues FOR EACH ROW
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'an issue is kept'`,
  `CREATE TABLE IF NOT EXISTS issue_papers (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    issue_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    paper VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    file_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY papers_of_issue (workshop_id, issue_id, paper),
    CONSTRAINT papers_of_issue FOREIGN KEY (workshop_id, issue_id) REFERENCES issues (workshop_id, id),
    CONSTRAINT papers_kept FOREIGN KEY (workshop_id, file_id) REFERENCES files (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS presences (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    estimate_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    membership_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    name VARCHAR(120) NOT NULL,
    seen_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, estimate_id, membership_id),
    CONSTRAINT presences_on_estimate FOREIGN KEY (workshop_id, estimate_id) REFERENCES estimates (workshop_id, id)
  ) ENGINE=InnoDB`,
]);
