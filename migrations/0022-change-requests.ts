import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE change_requests (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  consignment_id BIGINT UNSIGNED NOT NULL,
  revision INT UNSIGNED NOT NULL,
  user_id BIGINT UNSIGNED NOT NULL,
  subject VARCHAR(120) NOT NULL,
  text VARCHAR(2000) NOT NULL,
  at DATETIME(3) NOT NULL,
  KEY change_requests_consignment (consignment_id, id),
  CONSTRAINT change_requests_consignment FOREIGN KEY (consignment_id) REFERENCES consignments (id),
  CONSTRAINT change_requests_user FOREIGN KEY (user_id) REFERENCES users (id)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE change_requests')
