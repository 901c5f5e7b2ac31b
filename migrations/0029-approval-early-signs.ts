import type { Migration } from '@/lib/db/migrate'

/** Signs the vet wants the driver to ring for: part of what was signed for the crate. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(
    `ALTER TABLE approvals ADD COLUMN early_signs JSON NOT NULL DEFAULT '[]' AFTER conditions`,
  )

export const down: Migration = ({ context }) =>
  context.sequelize.query('ALTER TABLE approvals DROP COLUMN early_signs')
