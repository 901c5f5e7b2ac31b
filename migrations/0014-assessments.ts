import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE assessments (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  consignment_id BIGINT UNSIGNED NOT NULL,
  revision INT UNSIGNED NOT NULL,
  plan_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  input_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  scenario_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  status ENUM('queued','running','done','failed','superseded') NOT NULL DEFAULT 'queued',
  stage VARCHAR(60) NOT NULL DEFAULT '',
  done_count INT UNSIGNED NOT NULL DEFAULT 0,
  total_count INT UNSIGNED NOT NULL DEFAULT 0,
  engine_version VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  rules_version VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  profile_versions JSON NOT NULL,
  result_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NULL,
  verdict ENUM('go','conditional','no-go') NULL,
  error JSON NULL,
  requested_by BIGINT UNSIGNED NOT NULL,
  requested_at DATETIME(3) NOT NULL,
  started_at DATETIME(3) NULL,
  finished_at DATETIME(3) NULL,
  KEY assessments_consignment (consignment_id, id),
  KEY assessments_status (status, id),
  CONSTRAINT assessments_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id),
  CONSTRAINT assessments_scenario FOREIGN KEY (scenario_hash) REFERENCES snapshots (hash),
  CONSTRAINT assessments_requested_by FOREIGN KEY (requested_by) REFERENCES users (id)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE assessments')
