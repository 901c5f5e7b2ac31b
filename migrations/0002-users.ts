import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE users (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  email VARCHAR(254) NOT NULL,
  name VARCHAR(120) NOT NULL,
  role ENUM('dispatcher','vet','driver','shipper','admin') NOT NULL,
  shipper_id BIGINT UNSIGNED NULL,
  password_hash VARCHAR(200) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  telephone VARCHAR(40) NOT NULL DEFAULT '',
  registration_number VARCHAR(40) NULL,
  registration_country CHAR(2) CHARACTER SET ascii COLLATE ascii_bin NULL,
  registration_expires_on DATE NULL,
  registration_checked_by BIGINT UNSIGNED NULL,
  registration_checked_at DATETIME(3) NULL,
  disabled_at DATETIME(3) NULL,
  created_at DATETIME(3) NOT NULL,
  updated_at DATETIME(3) NOT NULL,
  UNIQUE KEY users_email (email),
  KEY users_role_name (role, name, id),
  CONSTRAINT users_shipper FOREIGN KEY (shipper_id) REFERENCES shippers (id),
  CONSTRAINT users_registration_checked_by FOREIGN KEY (registration_checked_by) REFERENCES users (id),
  CONSTRAINT users_shipper_only CHECK ((role = 'shipper') = (shipper_id IS NOT NULL))
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE users')
