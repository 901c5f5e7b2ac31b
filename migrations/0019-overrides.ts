import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE overrides (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  approval_id BIGINT UNSIGNED NOT NULL,
  finding_rule VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  animal_ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NULL,
  leg_ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NULL,
  reason VARCHAR(2000) NOT NULL,
  minutes_past INT NOT NULL,
  worst_body_c DOUBLE NULL,
  UNIQUE KEY overrides_finding (approval_id, finding_rule, animal_ref, leg_ref),
  CONSTRAINT overrides_approval FOREIGN KEY (approval_id) REFERENCES approvals (id),
  CONSTRAINT overrides_reasoned CHECK (CHAR_LENGTH(TRIM(reason)) > 0)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE overrides')
