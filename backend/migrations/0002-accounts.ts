import { migration } from '../src/platform/database/migration';
import { hash, id, instant, tableSettings } from './table-parts';

/** Workshops, the people of them, what they are sent by mail, the files they keep, and the history of what they did. */
export const accounts = migration('0002-accounts', [
  `CREATE TABLE IF NOT EXISTS accounts (
    id ${id} NOT NULL PRIMARY KEY,
    email VARCHAR(254) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
    name VARCHAR(120) NOT NULL,
    password_hash VARCHAR(200) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    created_at ${instant} NOT NULL,
    UNIQUE KEY accounts_email (email)
  ) ${tableSettings}`,
  `CREATE TABLE IF NOT EXISTS workshops (
    id ${id} NOT NULL PRIMARY KEY,
    name VARCHAR(120) NOT NULL,
    currency CHAR(3) NOT NULL,
    locale VARCHAR(35) NOT NULL,
    length_unit VARCHAR(2) NOT NULL,
    time_zone VARCHAR(60) NOT NULL,
    paper_size VARCHAR(6) NOT NULL,
    country CHAR(2) NOT NULL,
    address_lines JSON NOT NULL,
    telephone VARCHAR(40) NOT NULL,
    email VARCHAR(254) NOT NULL,
    tax_registration VARCHAR(40) NOT NULL,
    default_tax_category VARCHAR(2) NOT NULL,
    logo_file_id ${id} NULL,
    version INT NOT NULL,
    created_at ${instant} NOT NULL
  ) ${tableSettings}`,
  `CREATE TABLE IF NOT EXISTS files (
    workshop_id ${id} NOT NULL,
    id ${id} NOT NULL,
    sha256 ${hash} NOT NULL,
    name VARCHAR(300) NOT NULL,
    media VARCHAR(100) NOT NULL,
    size_bytes BIGINT NOT NULL,
    created_at ${instant} NOT NULL,
    PRIMARY KEY (workshop_id, id),
    KEY files_by_content (workshop_id, sha256),
    CONSTRAINT files_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id)
  ) ${tableSettings}`,
  `CREATE TABLE IF NOT EXISTS memberships (
    workshop_id ${id} NOT NULL,
    id ${id} NOT NULL,
    account_id ${id} NOT NULL,
    roles JSON NOT NULL,
    disabled_at ${instant} NULL,
    version INT NOT NULL,
    created_at ${instant} NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY memberships_id (id),
    UNIQUE KEY memberships_of_account (workshop_id, account_id),
    KEY memberships_by_account (account_id),
    CONSTRAINT memberships_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id),
    CONSTRAINT memberships_of_person FOREIGN KEY (account_id) REFERENCES accounts (id)
  ) ${tableSettings}`,
  `CREATE TABLE IF NOT EXISTS invitations (
    workshop_id ${id} NOT NULL,
    id ${id} NOT NULL,
    name VARCHAR(120) NOT NULL,
    email VARCHAR(254) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
    roles JSON NOT NULL,
    token_hash ${hash} NOT NULL,
    ends_at ${instant} NOT NULL,
    accepted_at ${instant} NULL,
    created_at ${instant} NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY invitations_token (token_hash),
    CONSTRAINT invitations_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id)
  ) ${tableSettings}`,
  `CREATE TABLE IF NOT EXISTS mailed_links (
    token_hash ${hash} NOT NULL PRIMARY KEY,
    purpose VARCHAR(20) NOT NULL,
    about VARCHAR(254) NOT NULL,
    content JSON NOT NULL,
    ends_at ${instant} NOT NULL,
    used_at ${instant} NULL,
    created_at ${instant} NOT NULL,
    KEY links_about (purpose, about, created_at),
    KEY links_by_age (ends_at)
  ) ${tableSettings}`,
  `CREATE TABLE IF NOT EXISTS audit (
    workshop_id ${id} NOT NULL,
    id ${id} NOT NULL,
    at ${instant} NOT NULL,
    account_id ${id} NULL,
    name VARCHAR(120) NOT NULL,
    subject_kind VARCHAR(40) NOT NULL,
    subject_id ${id} NOT NULL,
    job_id ${id} NULL,
    code VARCHAR(60) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    \`values\` JSON NOT NULL,
    \`before\` JSON NULL,
    \`after\` JSON NULL,
    PRIMARY KEY (workshop_id, id),
    KEY audit_of_job (workshop_id, job_id, id),
    KEY audit_of_subject (workshop_id, subject_id, id),
    CONSTRAINT audit_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id),
    CONSTRAINT audit_by_person FOREIGN KEY (account_id) REFERENCES accounts (id)
  ) ${tableSettings}`,
]);
