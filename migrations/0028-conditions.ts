import type { Migration } from '@/lib/db/migrate'

/** What was asked of whom, and the answer. An answer comes later than the question, so a row is written twice at most. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE conditions (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  consignment_id BIGINT UNSIGNED NOT NULL,
  revision INT UNSIGNED NOT NULL,
  plan_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  origin ENUM('narrow_margin','rule','vet') NOT NULL,
  approval_id BIGINT UNSIGNED NULL,
  finding_rule VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NULL,
  leg_ref VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NULL,
  party VARCHAR(120) NOT NULL,
  text VARCHAR(500) NOT NULL,
  ours BOOLEAN NOT NULL,
  asked_at DATETIME(3) NOT NULL,
  answer ENUM('confirmed','refused') NULL,
  answered_by VARCHAR(120) NULL,
  answered_how ENUM('writing','telephone','in person') NULL,
  answered_at DATETIME(3) NULL,
  answer_note VARCHAR(500) NOT NULL DEFAULT '',
  recorded_by BIGINT UNSIGNED NULL,
  kept BOOLEAN NULL,
  KEY conditions_consignment (consignment_id, revision, id),
  CONSTRAINT conditions_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id),
  CONSTRAINT conditions_approval FOREIGN KEY (approval_id) REFERENCES approvals (id),
  CONSTRAINT conditions_recorded_by FOREIGN KEY (recorded_by) REFERENCES users (id),
  CONSTRAINT conditions_answered_whole CHECK (
    (answer IS NULL) = (answered_at IS NULL) AND (answer IS NULL) = (recorded_by IS NULL) AND (answer IS NULL) = (answered_by IS NULL)
  )
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE conditions')
