import type { Migration } from '@/lib/db/migrate'

/** A row never changes: a better figure is a new version, so that old assessments stay explained. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE species_profiles (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  \`key\` VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  version INT UNSIGNED NOT NULL,
  common_name VARCHAR(80) NOT NULL,
  scientific_name VARCHAR(80) NOT NULL,
  profile JSON NOT NULL,
  created_by BIGINT UNSIGNED NULL,
  created_at DATETIME(3) NOT NULL,
  UNIQUE KEY species_profiles_key_version (\`key\`, version),
  CONSTRAINT species_profiles_created_by FOREIGN KEY (created_by) REFERENCES users (id)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE species_profiles')
