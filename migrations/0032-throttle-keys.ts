import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE throttle_keys (
  scope VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  key_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  last_at DATETIME(3) NOT NULL,
  PRIMARY KEY (scope, key_hash),
  KEY throttle_keys_last_at (last_at)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE throttle_keys')
