import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE openings (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  crate_id BIGINT UNSIGNED NOT NULL,
  ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  position SMALLINT UNSIGNED NOT NULL,
  face ENUM('front','back','left','right','top') NOT NULL,
  kind ENUM('door','slats','slots','holes','window') NOT NULL,
  width_cm DOUBLE NOT NULL,
  height_cm DOUBLE NOT NULL,
  how_many SMALLINT UNSIGNED NOT NULL,
  sill_height_cm DOUBLE NULL,
  mesh_open_pct DOUBLE NOT NULL,
  blocked_pct DOUBLE NOT NULL,
  UNIQUE KEY openings_ref (crate_id, ref),
  CONSTRAINT openings_crate FOREIGN KEY (crate_id) REFERENCES crates (id) ON DELETE CASCADE
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE openings')
