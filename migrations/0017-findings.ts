import type { Migration } from '@/lib/db/migrate'

/** The whole finding is in body; the columns beside it are those that lists filter and sort by. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE findings (
  assessment_id BIGINT UNSIGNED NOT NULL,
  ordinal SMALLINT UNSIGNED NOT NULL,
  rule VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  basis ENUM('law','standard','carrier','house','physiology') NOT NULL,
  status ENUM('met','note','condition','breach','judgement','unknown') NOT NULL,
  side ENUM('high','low') NULL,
  limit_kind ENUM('critical','alarm','cold-effort','other') NULL,
  animal_ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NULL,
  crate_ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NULL,
  leg_ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NULL,
  margin_min INT NULL,
  margin_outside_air_c DECIMAL(5,1) NULL,
  margin_body_c DECIMAL(6,3) NULL,
  minute DOUBLE NULL,
  overridable BOOLEAN NOT NULL,
  body JSON NOT NULL,
  PRIMARY KEY (assessment_id, ordinal),
  KEY findings_rule (rule, status),
  CONSTRAINT findings_assessment FOREIGN KEY (assessment_id) REFERENCES assessments (id) ON DELETE CASCADE
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE findings')
