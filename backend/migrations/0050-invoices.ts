import { migration } from '../src/platform/database/migration';

/** How a workshop invoices, invoices and credit notes, what was paid, given back, written off and reminded of. */
export const invoices = migration('0050-invoices', [
  `CREATE TABLE IF NOT EXISTS invoice_settings (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    content JSON NULL,
    PRIMARY KEY (workshop_id, id),
    CONSTRAINT invoice_settings_of_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS invoices (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    version INT NOT NULL,
    kind VARCHAR(12) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    state VARCHAR(8) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    client_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    job_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    credited_invoice_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    claim_issue_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    claim JSON NULL,
    currency CHAR(3) NOT NULL,
    content JSON NOT NULL,
    rounding_minor BIGINT NOT NULL,
    net_minor BIGINT NOT NULL,
    tax_minor BIGINT NOT NULL,
    gross_minor BIGINT NOT NULL,
    due_minor BIGINT NOT NULL,
    open_minor BIGINT NOT NULL,
    credited_minor BIGINT NOT NULL,
    number VARCHAR(40) NULL,
    series VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NULL,
    year INT NULL,
    ordinal BIGINT NULL,
    issued_on DATE NULL,
    issued_at DATETIME(3) NULL,
    issued_by VARCHAR(120) NULL,
    due_on DATE NULL,
    snapshot LONGBLOB NULL,
    sha256 CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NULL,
    pdf_file_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    xml_file_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY invoices_in_series (workshop_id, series, year, ordinal),
    UNIQUE KEY invoices_number (workshop_id, number),
    KEY invoices_of_client (workshop_id, client_id, id),
    KEY invoices_of_job (workshop_id, job_id, id),
    KEY invoices_of_credited (workshop_id, credited_invoice_id),
    KEY invoices_by_day (workshop_id, issued_on),
    KEY invoices_open (workshop_id, state, open_minor),
    CONSTRAINT invoices_of_client FOREIGN KEY (workshop_id, client_id) REFERENCES clients (workshop_id, id),
    CONSTRAINT invoices_of_job FOREIGN KEY (workshop_id, job_id) REFERENCES jobs (workshop_id, id),
    CONSTRAINT invoices_credited FOREIGN KEY (workshop_id, credited_invoice_id) REFERENCES invoices (workshop_id, id),
    CONSTRAINT invoices_claiming FOREIGN KEY (workshop_id, claim_issue_id) REFERENCES issues (workshop_id, id),
    CONSTRAINT invoices_pdf FOREIGN KEY (workshop_id, pdf_file_id) REFERENCES files (workshop_id, id),
    CONSTRAINT invoices_xml FOREIGN KEY (workshop_id, xml_file_id) REFERENCES files (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE OR REPLACE TRIGGER invoices_stay_as_issued BEFORE UPDATE ON invoices FOR EACH ROW
    IF OLD.state = 'issued' AND NOT (OLD.workshop_id <=> NEW.workshop_id AND OLD.id <=> NEW.id AND OLD.version <=> NEW.version AND OLD.kind <=> NEW.kind AND OLD.state <=> NEW.state AND OLD.client_id <=> NEW.client_id AND OLD.job_id <=> NEW.job_id AND OLD.credited_invoice_id <=> NEW.credited_invoice_id AND OLD.claim_issue_id <=> NEW.claim_issue_id AND OLD.claim <=> NEW.claim AND OLD.currency <=> NEW.currency AND OLD.content <=> NEW.content AND OLD.rounding_minor <=> NEW.rounding_minor AND OLD.net_minor <=> NEW.net_minor AND OLD.tax_minor <=> NEW.tax_minor AND OLD.gross_minor <=> NEW.gross_minor AND OLD.due_minor <=> NEW.due_minor AND OLD.number <=> NEW.number AND OLD.series <=> NEW.series AND OLD.year <=> NEW.year AND OLD.ordinal <=> NEW.ordinal AND OLD.issued_on <=> NEW.issued_on AND OLD.issued_at <=> NEW.issued_at AND OLD.issued_by <=> NEW.issued_by AND OLD.due_on <=> NEW.due_on AND OLD.snapshot <=> NEW.snapshot AND OLD.sha256 <=> NEW.sha256 AND OLD.pdf_file_id <=> NEW.pdf_file_id AND OLD.xml_file_id <=> NEW.xml_file_id) THEN
      SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'an invoice stays as it was issued';
    END IF`,
  `CREATE OR REPLACE TRIGGER invoices_are_kept BEFORE DELETE ON invoices FOR EACH ROW
    IF OLD.state = 'issued' THEN
      SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'an issued invoice is kept';
    END IF`,
  `CREATE TABLE IF NOT EXISTS stage_days (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    issue_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    claim_key VARCHAR(60) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    planned_on DATE NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY days_of_stage (workshop_id, issue_id, claim_key),
    CONSTRAINT days_of_issue FOREIGN KEY (workshop_id, issue_id) REFERENCES issues (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS payments (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    client_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    way VARCHAR(8) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    currency CHAR(3) NOT NULL,
    amount_minor BIGINT NOT NULL,
    credit_minor BIGINT NOT NULL,
    received_on DATE NOT NULL,
    reference VARCHAR(140) NOT NULL,
    refunds_payment_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    external_id VARCHAR(120) CHARACTER SET ascii COLLATE ascii_bin NULL,
    recorded_at DATETIME(3) NOT NULL,
    recorded_by VARCHAR(120) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY payments_external (workshop_id, external_id),
    KEY payments_of_client (workshop_id, client_id, id),
    KEY payments_by_day (workshop_id, received_on),
    KEY payments_refunding (workshop_id, refunds_payment_id),
    CONSTRAINT payments_of_client FOREIGN KEY (workshop_id, client_id) REFERENCES clients (workshop_id, id),
    CONSTRAINT payments_refunding FOREIGN KEY (workshop_id, refunds_payment_id) REFERENCES payments (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE OR REPLACE TRIGGER payments_stay BEFORE UPDATE ON payments FOR EACH ROW
    IF NOT (OLD.workshop_id <=> NEW.workshop_id AND OLD.id <=> NEW.id AND OLD.client_id <=> NEW.client_id AND OLD.way <=> NEW.way AND OLD.currency <=> NEW.currency AND OLD.amount_minor <=> NEW.amount_minor AND OLD.received_on <=> NEW.received_on AND OLD.reference <=> NEW.reference AND OLD.refunds_payment_id <=> NEW.refunds_payment_id AND OLD.external_id <=> NEW.external_id AND OLD.recorded_at <=> NEW.recorded_at AND OLD.recorded_by <=> NEW.recorded_by) THEN
      SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'a payment stays as it was recorded';
    END IF`,
  `CREATE OR REPLACE TRIGGER payments_are_kept BEFORE DELETE ON payments FOR EACH ROW
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'a payment is kept'`,
  `CREATE TABLE IF NOT EXISTS payment_shares (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    payment_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    invoice_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    amount_minor BIGINT NOT NULL,
    at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    KEY shares_of_payment (workshop_id, payment_id),
    KEY shares_of_invoice (workshop_id, invoice_id),
    CONSTRAINT shares_of_payment FOREIGN KEY (workshop_id, payment_id) REFERENCES payments (workshop_id, id),
    CONSTRAINT shares_of_invoice FOREIGN KEY (workshop_id, invoice_id) REFERENCES invoices (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE OR REPLACE TRIGGER shares_stay BEFORE UPDATE ON payment_shares FOR EACH ROW
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'a share of a payment stays'`,
  `CREATE OR REPLACE TRIGGER shares_are_kept BEFORE DELETE ON payment_shares FOR EACH ROW
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'a share of a payment is kept'`,
  `CREATE TABLE IF NOT EXISTS write_offs (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    invoice_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    amount_minor BIGINT NOT NULL,
    reason VARCHAR(200) NOT NULL,
    written_on DATE NOT NULL,
    at DATETIME(3) NOT NULL,
    by_name VARCHAR(120) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    KEY write_offs_of_invoice (workshop_id, invoice_id),
    KEY write_offs_by_day (workshop_id, written_on),
    CONSTRAINT write_offs_of_invoice FOREIGN KEY (workshop_id, invoice_id) REFERENCES invoices (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE OR REPLACE TRIGGER write_offs_stay BEFORE UPDATE ON write_offs FOR EACH ROW
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'what was written off stays'`,
  `CREATE OR REPLACE TRIGGER write_offs_are_kept BEFORE DELETE ON write_offs FOR EACH ROW
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'what was written off is kept'`,
  `CREATE TABLE IF NOT EXISTS checkouts (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    invoice_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    access_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    state VARCHAR(8) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    amount_minor BIGINT NOT NULL,
    currency CHAR(3) NOT NULL,
    session_id VARCHAR(120) CHARACTER SET ascii COLLATE ascii_bin NULL,
    url VARCHAR(2000) NULL,
    intent_id VARCHAR(120) CHARACTER SET ascii COLLATE ascii_bin NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    UNIQUE KEY checkouts_by_session (session_id),
    KEY checkouts_by_intent (intent_id),
    KEY checkouts_of_invoice (workshop_id, invoice_id),
    CONSTRAINT checkouts_of_invoice FOREIGN KEY (workshop_id, invoice_id) REFERENCES invoices (workshop_id, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS payment_events (
    id VARCHAR(120) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
    kind VARCHAR(80) NOT NULL,
    content LONGTEXT NOT NULL,
    received_at DATETIME(3) NOT NULL,
    checkout_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    KEY payment_events_by_checkout (checkout_id, received_at)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS reminders (
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    invoice_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    open_minor BIGINT NOT NULL,
    email VARCHAR(254) NOT NULL,
    at DATETIME(3) NOT NULL,
    by_name VARCHAR(120) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    KEY reminders_of_invoice (workshop_id, invoice_id),
    CONSTRAINT reminders_of_invoice FOREIGN KEY (workshop_id, invoice_id) REFERENCES invoices (workshop_id, id)
  ) ENGINE=InnoDB`,
]);
