import type { Migration } from '@/lib/db/migrate'

/** Append-only: the application may insert and read (lib/local/grants.mjs). */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE audit_events (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  at DATETIME(3) NOT NULL,
  actor_id BIGINT UNSIGNED NULL,
  actor_role VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NULL,
  ip VARCHAR(45) CHARACTER SET ascii COLLATE ascii_bin NULL,
  verb VARCHAR(60) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  subject_type VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  subject_id VARCHAR(64) CHARACTER SET ascii COLLATE ascii_bin NULL,
  consignment_id BIGINT UNSIGNED NULL,
  request_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
  \`before\` JSON NULL,
  \`after\` JSON NULL,
  note VARCHAR(1000) NOT NULL DEFAULT '',
  UNIQUE KEY audit_events_request (request_id, verb),
  KEY audit_events_at (at, id),
  KEY audit_events_actor (actor_id, id),
  KEY audit_events_consignment (consignment_id, id),
  KEY audit_events_verb (verb, id),
  CONSTRAINT audit_events_actor FOREIGN KEY (actor_id) REFERENCES users (id),
  CONSTRAINT audit_events_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE audit_events')
