import type { Migration } from '@/lib/db/migrate'

/** What people typed, kept to the last digit (DOUBLE, wall times as text): a plan read back hashes as it was saved. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE animals (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  consignment_id BIGINT UNSIGNED NOT NULL,
  ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  position SMALLINT UNSIGNED NOT NULL,
  name VARCHAR(60) NOT NULL,
  profile_key VARCHAR(40) NOT NULL,
  breed_note VARCHAR(80) NOT NULL,
  identification VARCHAR(80) NOT NULL,
  sex ENUM('male','female','unknown') NOT NULL,
  age_days DOUBLE NULL,
  mass_kg DOUBLE NULL,
  count SMALLINT UNSIGNED NOT NULL,
  temperament ENUM('calm','anxious','unknown') NOT NULL,
  crate_trained BOOLEAN NOT NULL,
  coat_depth_mm DOUBLE NULL,
  coat_clipped BOOLEAN NOT NULL,
  coat_wet_pct DOUBLE NOT NULL,
  flags JSON NOT NULL,
  medicines VARCHAR(300) NOT NULL,
  examined_on VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  examined_by VARCHAR(120) NOT NULL,
  last_fed_local VARCHAR(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  last_watered_local VARCHAR(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  UNIQUE KEY animals_ref (consignment_id, ref),
  KEY animals_profile (profile_key),
  CONSTRAINT animals_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id) ON DELETE CASCADE
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE animals')
