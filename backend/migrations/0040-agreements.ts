import { migration } from '../src/platform/database/migration';

/** What a workshop and its client settle: ways in for clients, questions, decisions. */
export const agreements = migration('0040-agreements', [
  `CREATE TABLE IF NOT EXISTS client_accesses (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    client_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    job_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    purpose VARCHAR(8) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    token_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    created_at DATETIME(3) NOT NULL,
    created_by VARCHAR(120) NOT NULL,
    ends_at DATETIME(3) NOT NULL,
    revoked_at DATETIME(3) NULL,
    opened_at DATETIME(3) NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY accesses_by_token (token_hash),
    KEY accesses_of_job (workshop_id, job_id, id),
    KEY accesses_of_client (workshop_id, client_id, id),
    CONSTRAINT accesses_of_client FOREIGN KEY (workshop_id, client_id) REFERENCES clients (workshop_id, id),
    CONSTRAINT accesses_of_job FOREIGN KEY (workshop_id, job_id) REFERENCES jobs (workshop_id, id)
  ) ENGINE=InnoDB`,
]);
