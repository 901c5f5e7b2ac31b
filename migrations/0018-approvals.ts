import type { Migration } from '@/lib/db/migrate'

/** What was signed never changes; the only later facts are that it was voided or withdrawn. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE approvals (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  consignment_id BIGINT UNSIGNED NOT NULL,
  revision INT UNSIGNED NOT NULL,
  crate_ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  plan_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  assessment_id BIGINT UNSIGNED NOT NULL,
  decision ENUM('approved','approved_with_conditions','returned') NOT NULL,
  conditions JSON NOT NULL,
  reasons VARCHAR(2000) NOT NULL DEFAULT '',
  examined BOOLEAN NOT NULL,
  statement TEXT NOT NULL,
  signer_id BIGINT UNSIGNED NOT NULL,
  signer_name VARCHAR(120) NOT NULL,
  registration_number VARCHAR(40) NOT NULL,
  registration_country CHAR(2) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  registration_expires_on DATE NOT NULL,
  signed_at DATETIME(3) NOT NULL,
  voided_at DATETIME(3) NULL,
  voided_reason VARCHAR(500) NULL,
  withdrawn BOOLEAN NOT NULL DEFAULT FALSE,
  KEY approvals_consignment (consignment_id, revision, crate_ref),
  KEY approvals_signer (signer_id, signed_at),
  CONSTRAINT approvals_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id),
  CONSTRAINT approvals_assessment FOREIGN KEY (assessment_id) REFERENCES assessments (id),
  CONSTRAINT approvals_signer FOREIGN KEY (signer_id) REFERENCES users (id),
  CONSTRAINT approvals_voided_whole CHECK ((voided_at IS NULL) = (voided_reason IS NULL)),
  CONSTRAINT approvals_withdrawn_is_void CHECK (NOT withdrawn OR voided_at IS NOT NULL)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE approvals')
