import type { Migration } from '@/lib/db/migrate'

/** Canonical JSON under the SHA-256 of its bytes, kept for good. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE snapshots (
  hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
  kind VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  body LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
  created_at DATETIME(3) NOT NULL
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE snapshots')
