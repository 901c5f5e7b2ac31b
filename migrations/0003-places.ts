import type { Migration } from '@/lib/db/migrate'

export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE places (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  name VARCHAR(120) NOT NULL,
  kind ENUM('address','depot','kennel','clinic','airport','seaport','railhead','border_post') NOT NULL,
  address VARCHAR(300) NOT NULL DEFAULT '',
  country CHAR(2) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  zone VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  latitude DECIMAL(8,5) NOT NULL,
  longitude DECIMAL(8,5) NOT NULL,
  telephone VARCHAR(40) NOT NULL DEFAULT '',
  hours VARCHAR(120) NOT NULL DEFAULT '',
  created_at DATETIME(3) NOT NULL,
  updated_at DATETIME(3) NOT NULL,
  UNIQUE KEY places_name (name),
  CONSTRAINT places_on_earth CHECK (latitude BETWEEN -90 AND 90 AND longitude BETWEEN -180 AND 180)
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE places')
