import type { Migration } from '@/lib/db/migrate'

/** Apart from the table itself, because an assessment already points to its consignment. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(`ALTER TABLE consignments
  ADD CONSTRAINT consignments_assessment FOREIGN KEY (assessment_id) REFERENCES assessments (id)`)

export const down: Migration = ({ context }) =>
  context.sequelize.query('ALTER TABLE consignments DROP FOREIGN KEY consignments_assessment')
