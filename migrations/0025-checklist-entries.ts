import type { Migration } from '@/lib/db/migrate'

/** client_id is minted on the device: an entry sent twice is stored once. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE checklist_entries (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  client_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  consignment_id BIGINT UNSIGNED NOT NULL,
  revision INT UNSIGNED NOT NULL,
  leg_ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NULL,
  item_key VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  kind ENUM('tick','not_done','reading','water','condition','handover','note','close_leg') NOT NULL,
  at DATETIME(3) NOT NULL,
  place VARCHAR(160) NOT NULL DEFAULT '',
  value JSON NOT NULL,
  alive SMALLINT UNSIGNED NULL,
  dead SMALLINT UNSIGNED NULL,
  short SMALLINT UNSIGNED NULL,
  user_id BIGINT UNSIGNED NOT NULL,
  received_at DATETIME(3) NOT NULL,
  UNIQUE KEY checklist_entries_client_id (client_id),
  KEY checklist_entries_consignment (consignment_id, at, id),
  CONSTRAINT checklist_entries_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id),
  CONSTRAINT checklist_entries_user FOREIGN KEY (user_id) REFERENCES users (id)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE checklist_entries')
