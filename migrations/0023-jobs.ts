import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE jobs (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  kind VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  payload JSON NOT NULL,
  dedupe_key VARCHAR(120) CHARACTER SET ascii COLLATE ascii_bin NULL,
  state ENUM('queued','running','done','failed') NOT NULL DEFAULT 'queued',
  attempts SMALLINT UNSIGNED NOT NULL DEFAULT 0,
  run_after DATETIME(3) NOT NULL,
  lease_until DATETIME(3) NULL,
  leased_by VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NULL,
  last_error VARCHAR(2000) NULL,
  progress JSON NULL,
  created_at DATETIME(3) NOT NULL,
  updated_at DATETIME(3) NOT NULL,
  UNIQUE KEY jobs_dedupe_key (dedupe_key),
  KEY jobs_due (state, run_after, id),
  KEY jobs_lease (state, lease_until)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE jobs')
