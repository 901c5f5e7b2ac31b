import type { Migration } from '@/lib/db/migrate'

/** The bytes as issued. The application may change the state of a document and nothing else of it (lib/local/grants.mjs). */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE documents (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  consignment_id BIGINT UNSIGNED NOT NULL,
  revision INT UNSIGNED NOT NULL,
  kind ENUM('go_no_go','manifest') NOT NULL,
  code CHAR(8) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  state ENUM('current','superseded','void') NOT NULL DEFAULT 'current',
  bytes LONGBLOB NOT NULL,
  sha256 CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  plan_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  view_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  size_bytes INT UNSIGNED NOT NULL,
  page_count SMALLINT UNSIGNED NOT NULL,
  made_at DATETIME(3) NOT NULL,
  made_by BIGINT UNSIGNED NOT NULL,
  state_changed_at DATETIME(3) NULL,
  voided_reason VARCHAR(500) NULL,
  UNIQUE KEY documents_code (code),
  UNIQUE KEY documents_sha256 (sha256),
  KEY documents_consignment (consignment_id, kind, revision),
  CONSTRAINT documents_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id),
  CONSTRAINT documents_made_by FOREIGN KEY (made_by) REFERENCES users (id),
  CONSTRAINT documents_whole CHECK (size_bytes = LENGTH(bytes))
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE documents')
