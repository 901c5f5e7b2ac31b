import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE acknowledgements (
  document_id BIGINT UNSIGNED NOT NULL PRIMARY KEY,
  user_id BIGINT UNSIGNED NOT NULL,
  at DATETIME(3) NOT NULL,
  CONSTRAINT acknowledgements_document FOREIGN KEY (document_id) REFERENCES documents (id),
  CONSTRAINT acknowledgements_user FOREIGN KEY (user_id) REFERENCES users (id)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE acknowledgements')
