import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE crates (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  consignment_id BIGINT UNSIGNED NOT NULL,
  ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  position SMALLINT UNSIGNED NOT NULL,
  letter CHAR(1) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  crate_model_id BIGINT UNSIGNED NULL,
  form ENUM('crate','stall','pen') NOT NULL,
  length_cm DOUBLE NULL,
  width_cm DOUBLE NULL,
  height_cm DOUBLE NULL,
  wall_material VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  wall_thickness_mm DOUBLE NOT NULL,
  rim_mm DOUBLE NOT NULL,
  floor_material VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  floor_thickness_mm DOUBLE NOT NULL,
  floor_onto ENUM('deck','slats','air') NOT NULL,
  bedding_material VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  bedding_depth_mm DOUBLE NOT NULL,
  bedding_wet_pct DOUBLE NOT NULL,
  water_container_l DOUBLE NULL,
  UNIQUE KEY crates_ref (consignment_id, ref),
  KEY crates_crate_model (crate_model_id),
  CONSTRAINT crates_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id) ON DELETE CASCADE,
  CONSTRAINT crates_crate_model FOREIGN KEY (crate_model_id) REFERENCES crate_models (id)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE crates')
