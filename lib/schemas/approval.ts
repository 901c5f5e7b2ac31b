import { z } from 'zod'
import { consignmentActSchema, itemId, requestId, rowId } from './act'
import { printed, requiredText, text } from './quantity'
import { typedPassword } from './sign-in'

const crateIds = z.array(itemId).min(1, { error: 'Crates: choose at least one.' }).max(26)

/** A condition the vet puts with an approval, in words a handler understands. */
export const vetConditionSchema = z.object({
  text: printed(requiredText('Condition', 300)),
  /** null: the whole journey. */
  legId: itemId.nullable(),
  party: printed(text('Asked of', 120)),
})

/** What the driver is told to ring for, chosen by the vet for a crate. */
export const earlySignSchema = z.object({ crateId: itemId, text: printed(requiredText('Early sign', 200)) })

/** Overriding names one finding of the assessment by its place in it, and says why. */
export const overrideSchema = z.object({
  findingIndex: z.number().int().nonnegative(),
  reason: printed(requiredText('Reason of the override', 1_000)).min(10, {
    error: 'Reason of the override: put at least 10 characters, it stands beside the stamp.',
  }),
})

/** One signature over one or several crate set-ups, on the figures the page showed. */
export const approveSchema = consignmentActSchema.extend({
  crateIds,
  /** What the page showed: refused if the plan has moved on since. */
  planHash: z.string().regex(/^[0-9a-f]{64}$/, { error: 'This page is out of step: load it again.' }),
  password: typedPassword,
  examined: z.boolean(),
  conditions: z.array(vetConditionSchema).max(30, { error: 'Conditions: put at most 30.' }),
  earlySigns: z.array(earlySignSchema).max(80, { error: 'Early signs: put at most 80.' }).optional(),
  overrides: z.array(overrideSchema).max(60, { error: 'Overrides: put at most 60.' }),
})
export type ApproveCrates = z.infer<typeof approveSchema>

export const returnSchema = consignmentActSchema.extend({ crateIds, reason: requiredText('Reason', 1_000) })
export type ReturnCrates = z.infer<typeof returnSchema>

export const withdrawSchema = z.object({
  approvalId: rowId,
  requestId,
  reason: requiredText('Reason', 1_000),
})
export type WithdrawApproval = z.infer<typeof withdrawSchema>
