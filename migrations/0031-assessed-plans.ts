import type { Migration } from '@/lib/db/migrate'

/** The plan as it was when it was assessed: what a vet signs rests on it, whatever becomes of the working plan. */
export const up: Migration = ({ context }) =>
  context.sequelize.query(
    `ALTER TABLE assessments ADD COLUMN plan_snapshot_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NULL
       AFTER scenario_hash,
     ADD CONSTRAINT assessments_plan FOREIGN KEY (plan_snapshot_hash) REFERENCES snapshots (hash)`,
  )

export const down: Migration = ({ context }) =>
  context.sequelize.query(
    'ALTER TABLE assessments DROP FOREIGN KEY assessments_plan, DROP KEY assessments_plan, DROP COLUMN plan_snapshot_hash',
  )
