import type { Migration } from '@/lib/db/migrate'

/**
 * The board sorts by the narrowest margin, and what has none yet stands last either way: an order an index of the bare
 * column cannot give.
 */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`ALTER TABLE consignments
  ADD COLUMN margin_rising DECIMAL(6,1) AS (IFNULL(margin_outside_air_c, 9999.9)) STORED,
  ADD COLUMN margin_falling DECIMAL(6,1) AS (IFNULL(margin_outside_air_c, -9999.9)) STORED,
  ADD KEY consignments_margin_rising (margin_rising, id),
  ADD KEY consignments_margin_falling (margin_falling, id)`)

export const down: Migration = ({ context }) =>
  context.sequelize.query(`ALTER TABLE consignments
  DROP KEY consignments_margin_rising,
  DROP KEY consignments_margin_falling,
  DROP COLUMN margin_rising,
  DROP COLUMN margin_falling`)
