import type { Migration } from '@/lib/db/migrate'

/** Gzipped JSON, apart from assessments so that lists never carry it. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE assessment_tracks (
  assessment_id BIGINT UNSIGNED NOT NULL PRIMARY KEY,
  body LONGBLOB NOT NULL,
  CONSTRAINT assessment_tracks_assessment FOREIGN KEY (assessment_id) REFERENCES assessments (id) ON DELETE CASCADE
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE assessment_tracks')
