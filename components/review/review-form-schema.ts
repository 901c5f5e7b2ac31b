import { z } from 'zod'
import { earlySignSchema, overrideSchema, vetConditionSchema } from '@/lib/schemas/approval'
import type { ApproveCrates, ReturnCrates } from '@/lib/schemas/approval'
import { itemId } from '@/lib/schemas/act'
import type { FindingView } from '@/lib/views/sheet'
import { concernedIndexes } from './override-words'
import type { Coverage } from './override-words'

export const DECISIONS = ['approve', 'return'] as const
export type Decision = (typeof DECISIONS)[number]

const overrideRowSchema = z.object({ on: z.boolean(), reason: z.string() })
const signRowSchema = z.object({ on: z.boolean(), crateId: z.string(), text: z.string().max(200) })
const conditionRowSchema = vetConditionSchema.extend({ legId: z.string() })

/**
 * The review as a vet fills it in: one row of overrides for each finding on the page. What the verbs take is made of it
 * below; the verbs check it again against the stored findings.
 */
export const reviewFormSchema = z
  .object({
    decision: z.enum(DECISIONS, { error: 'Decision: choose approve or return.' }),
    crateIds: z.array(itemId).min(1, { error: 'Crates: choose at least one.' }),
    overrides: z.array(overrideRowSchema),
    conditions: z.array(conditionRowSchema),
    signs: z.array(signRowSchema),
    reasons: z.string(),
    examined: z.string(),
    password: z.string(),
  })
  .superRefine((values, context) => {
    const issue = (path: (string | number)[], message: string) =>
      context.addIssue({ code: 'custom', path, message })
    if (values.decision === 'return') {
      if (values.reasons.trim() === '')
        issue(['reasons'], 'Reasons are missing: say what the desk has to change.')
      return
    }
    values.overrides.forEach(({ on, reason }, index) => {
      const parsed = overrideSchema.shape.reason.safeParse(reason)
      if (on && !parsed.success) issue(['overrides', index, 'reason'], parsed.error.issues[0]?.message ?? '')
    })
    values.signs.forEach(({ on, text }, index) => {
      const parsed = earlySignSchema.shape.text.safeParse(text)
      // An empty row is no sign, and is left out.
      if (on && text.trim() !== '' && !parsed.success)
        issue(['signs', index, 'text'], parsed.error.issues[0]?.message ?? '')
    })
    if (values.examined === '') issue(['examined'], 'Examined: say whether you have examined the animals.')
    if (values.password === '') issue(['password'], 'Your password is missing.')
  })

export type ReviewForm = z.infer<typeof reviewFormSchema>

export interface ReviewSubject {
  consignmentId: number
  planHash: string
  findings: readonly FindingView[]
  coverage: Coverage
}

/** What the approve verb takes: a row that speaks of several findings overrides each of them for the same reason. */
export function approvalOf(values: ReviewForm, subject: ReviewSubject, requestId: string): ApproveCrates {
  return {
    consignmentId: subject.consignmentId,
    requestId,
    crateIds: values.crateIds,
    planHash: subject.planHash,
    password: values.password,
    examined: values.examined === 'yes',
    conditions: values.conditions.map((row) => ({ ...row, legId: row.legId === '' ? null : row.legId })),
    earlySigns: values.signs
      .filter(({ on, crateId, text }) => on && text.trim() !== '' && values.crateIds.includes(crateId))
      .map(({ crateId, text }) => ({ crateId, text: text.trim() })),
    overrides: chosenOverrides(values, subject.findings).flatMap(({ finding, reason }) =>
      concernedIndexes(finding, subject.coverage, values.crateIds).map((findingIndex) => ({
        findingIndex,
        reason,
      })),
    ),
  }
}

export function returnOf(values: ReviewForm, subject: ReviewSubject, requestId: string): ReturnCrates {
  return {
    consignmentId: subject.consignmentId,
    requestId,
    crateIds: values.crateIds,
    reason: values.reasons.trim(),
  }
}

/** Findings ticked for overriding, with the reason given. */
export function chosenOverrides(
  values: Pick<ReviewForm, 'overrides'>,
  findings: readonly FindingView[],
): { finding: FindingView; reason: string }[] {
  return findings.flatMap((finding, index) => {
    const row = values.overrides[index]
    return row?.on ? [{ finding, reason: row.reason.trim() }] : []
  })
}
