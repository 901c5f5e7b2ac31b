import type { Migration } from '@/lib/db/migrate'

/** The figure an override of air, water or carbon dioxide was signed for: such findings have no body temperature. */
export const up: Migration = ({ context }) =>
  context.sequelize.query('ALTER TABLE overrides ADD COLUMN worst_value DOUBLE NULL AFTER worst_body_c')

export const down: Migration = ({ context }) =>
  context.sequelize.query('ALTER TABLE overrides DROP COLUMN worst_value')
