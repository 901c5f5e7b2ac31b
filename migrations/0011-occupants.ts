import type { Migration } from '@/lib/db/migrate'

/** The animal is the key: it stands in one crate at most. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE occupants (
  animal_id BIGINT UNSIGNED NOT NULL PRIMARY KEY,
  crate_id BIGINT UNSIGNED NOT NULL,
  position SMALLINT UNSIGNED NOT NULL,
  KEY occupants_crate (crate_id, position),
  CONSTRAINT occupants_animal FOREIGN KEY (animal_id) REFERENCES animals (id) ON DELETE CASCADE,
  CONSTRAINT occupants_crate FOREIGN KEY (crate_id) REFERENCES crates (id) ON DELETE CASCADE
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE occupants')
