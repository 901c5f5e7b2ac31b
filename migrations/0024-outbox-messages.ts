import type { Migration } from '@/lib/db/migrate'

/** A mail is written in the transaction that decided it, and goes out later from its row. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE outbox_messages (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  message_id VARCHAR(160) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  consignment_id BIGINT UNSIGNED NULL,
  to_address VARCHAR(254) NOT NULL,
  subject VARCHAR(250) NOT NULL,
  text MEDIUMTEXT NOT NULL,
  html MEDIUMTEXT NOT NULL,
  attachments JSON NOT NULL,
  dedupe_key VARCHAR(160) CHARACTER SET ascii COLLATE ascii_bin NULL,
  state ENUM('waiting','sending','sent','uncertain','failed') NOT NULL DEFAULT 'waiting',
  attempts SMALLINT UNSIGNED NOT NULL DEFAULT 0,
  next_attempt_at DATETIME(3) NOT NULL,
  lease_until DATETIME(3) NULL,
  leased_by VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NULL,
  last_error VARCHAR(2000) NULL,
  sent_at DATETIME(3) NULL,
  created_at DATETIME(3) NOT NULL,
  updated_at DATETIME(3) NOT NULL,
  UNIQUE KEY outbox_messages_message_id (message_id),
  UNIQUE KEY outbox_messages_dedupe_key (dedupe_key),
  KEY outbox_messages_due (state, next_attempt_at, id),
  KEY outbox_messages_lease (state, lease_until),
  KEY outbox_messages_consignment (consignment_id, id),
  CONSTRAINT outbox_messages_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE outbox_messages')
