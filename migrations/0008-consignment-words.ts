import type { Migration } from '@/lib/db/migrate'

/** Every word a consignment can be found by; LIKE 'word%' walks the primary key. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE consignment_words (
  word VARCHAR(40) NOT NULL,
  consignment_id BIGINT UNSIGNED NOT NULL,
  PRIMARY KEY (word, consignment_id),
  KEY consignment_words_consignment (consignment_id),
  CONSTRAINT consignment_words_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id) ON DELETE CASCADE
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE consignment_words')
