import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE throttle_attempts (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  scope VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  key_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  at DATETIME(3) NOT NULL,
  KEY throttle_attempts_key (scope, key_hash, at),
  KEY throttle_attempts_at (at)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE throttle_attempts')
