import { migration } from '../src/platform/database/migration';

/** Clients and their jobs; each order and each filter of their lists has its index. */
export const jobs = migration('0020-jobs', [
  `CREATE TABLE IF NOT EXISTS clients (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    name VARCHAR(120) NOT NULL,
    kind VARCHAR(20) NOT NULL,
    contact VARCHAR(200) NOT NULL,
    email VARCHAR(254) NOT NULL,
    telephone VARCHAR(40) NOT NULL,
    address VARCHAR(600) NOT NULL,
    website VARCHAR(2000) NOT NULL,
    tax_registration VARCHAR(40) NOT NULL,
    note TEXT NOT NULL,
    jobs INT NOT NULL,
    version INT NOT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    KEY clients_by_name (workshop_id, name, id),
    CONSTRAINT clients_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS jobs (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    client_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    year INT NOT NULL,
    ordinal BIGINT NOT NULL,
    title VARCHAR(120) NOT NULL,
    kind VARCHAR(20) NOT NULL,
    reference VARCHAR(80) NOT NULL,
    site VARCHAR(200) NOT NULL,
    note TEXT NOT NULL,
    state VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    reached VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    changed_at DATETIME(3) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY jobs_by_number (workshop_id, year, ordinal),
    KEY jobs_by_change (workshop_id, changed_at, id),
    KEY jobs_by_title (workshop_id, title, id),
    KEY jobs_by_state (workshop_id, state, changed_at, id),
    KEY jobs_of_client (workshop_id, client_id, changed_at, id),
    CONSTRAINT jobs_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id),
    CONSTRAINT jobs_for_client FOREIGN KEY (workshop_id, client_id) REFERENCES clients (workshop_id, id)
  ) ENGINE=InnoDB`,
]);
