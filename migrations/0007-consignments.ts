import type { Migration } from '@/lib/db/migrate'

/** A mark is unique among open consignments and free again once one is closed: open_mark is null from then on. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`CREATE TABLE consignments (
  id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
  mark VARCHAR(4) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
  shipper_id BIGINT UNSIGNED NOT NULL,
  state ENUM('draft','assessed','in_review','returned','approved','released','under_way','delivered','stopped','cancelled')
    NOT NULL DEFAULT 'draft',
  revision INT UNSIGNED NOT NULL DEFAULT 1,
  version INT UNSIGNED NOT NULL DEFAULT 0,
  in_force_revision INT UNSIGNED NULL,
  in_force_state ENUM('released','under_way','delivered','stopped') NULL,
  in_force_snapshot_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NULL,
  open_mark VARCHAR(4) CHARACTER SET ascii COLLATE ascii_bin GENERATED ALWAYS AS (
    IF(state IN ('delivered','stopped','cancelled') OR COALESCE(in_force_state, 'released') IN ('delivered','stopped'), NULL, mark)
  ) STORED,
  purpose ENUM('commercial','research','exhibition','private') NOT NULL,
  parties JSON NOT NULL,
  handling_note VARCHAR(1000) NOT NULL DEFAULT '',
  plan_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NULL,
  assessment_id BIGINT UNSIGNED NULL,
  departs_at DATETIME(3) NULL,
  departs_zone VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NULL,
  arrives_at DATETIME(3) NULL,
  arrives_zone VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NULL,
  from_place_name VARCHAR(120) NULL,
  to_place_name VARCHAR(120) NULL,
  animals_summary VARCHAR(200) NOT NULL DEFAULT '',
  verdict ENUM('go','conditional','no-go') NULL,
  deciding VARCHAR(300) NULL,
  margin_min INT NULL,
  margin_outside_air_c DECIMAL(5,1) NULL,
  margin_body_c DECIMAL(6,3) NULL,
  out_of_date BOOLEAN NOT NULL DEFAULT FALSE,
  holder ENUM('dispatcher','vet','driver','shipper','nobody') NOT NULL DEFAULT 'dispatcher',
  stopped_reason VARCHAR(500) NULL,
  created_by BIGINT UNSIGNED NOT NULL,
  created_at DATETIME(3) NOT NULL,
  updated_at DATETIME(3) NOT NULL,
  UNIQUE KEY consignments_open_mark (open_mark),
  KEY consignments_mark (mark, id),
  KEY consignments_departs (departs_at, id),
  KEY consignments_arrives (arrives_at, id),
  KEY consignments_updated (updated_at, id),
  KEY consignments_margin (margin_min, id),
  KEY consignments_margin_outside_air (margin_outside_air_c, id),
  KEY consignments_state_departs (state, departs_at, id),
  KEY consignments_in_force_departs (in_force_state, departs_at, id),
  KEY consignments_verdict_departs (verdict, departs_at, id),
  KEY consignments_holder_departs (holder, departs_at, id),
  KEY consignments_shipper_departs (shipper_id, departs_at, id),
  -- Named here, so that taking back its foreign key (0015) leaves no index behind.
  KEY consignments_assessment (assessment_id),
  CONSTRAINT consignments_shipper FOREIGN KEY (shipper_id) REFERENCES shippers (id),
  CONSTRAINT consignments_in_force_snapshot FOREIGN KEY (in_force_snapshot_hash) REFERENCES snapshots (hash),
  CONSTRAINT consignments_created_by FOREIGN KEY (created_by) REFERENCES users (id),
  CONSTRAINT consignments_mark_digits CHECK (mark REGEXP '^[0-9]{4}$'),
  CONSTRAINT consignments_in_force_whole CHECK (
    (in_force_revision IS NULL) = (in_force_state IS NULL) AND (in_force_revision IS NULL) = (in_force_snapshot_hash IS NULL)
  )
)`)

export const down: Migration = ({ context }) => context.sequelize.query('DROP TABLE consignments')
