import { z } from 'zod'
import { printed, requiredText, text } from './quantity'

/*
 * What every act on a consignment says: which one, and a number minted by the page that makes a second press of the same
 * button do nothing more.
 */

export const requestId = z.uuid({ error: 'This page is out of step: load it again.' })
export const rowId = z.number().int().positive()
export const itemId = z
  .string()
  .regex(/^[a-z0-9-]{1,24}$/, { error: 'This part has lost its id: load the page again.' })

export const consignmentActSchema = z.object({ consignmentId: rowId, requestId })
export type ConsignmentAct = z.infer<typeof consignmentActSchema>

export const cancelSchema = consignmentActSchema.extend({ reason: requiredText('Reason', 500) })
export type CancelConsignment = z.infer<typeof cancelSchema>

/** A driver needs no reason; a dispatcher acting in a driver's place does, and the verb asks for it. */
export const departSchema = consignmentActSchema.extend({ inPlaceOfDriver: text('Reason', 500) })
export type DepartConsignment = z.infer<typeof departSchema>

export const deliverSchema = departSchema.extend({ receivedBy: requiredText('Received by', 120) })
export type DeliverConsignment = z.infer<typeof deliverSchema>

export const stopJourneySchema = departSchema.extend({
  reason: requiredText('Why the journey was broken off', 500),
  whereAnimalsAre: requiredText('Where the animals are', 300),
})
export type StopConsignment = z.infer<typeof stopJourneySchema>

/** The dispatcher says that the air typed for these legs still holds; empty means all legs. */
export const confirmAirSchema = consignmentActSchema.extend({ legIds: z.array(itemId).max(40) })
export type ConfirmAir = z.infer<typeof confirmAirSchema>

export const conditionAnswerSchema = z.object({
  conditionId: rowId,
  requestId,
  answer: z.enum(['confirmed', 'refused']),
  how: z.enum(['writing', 'telephone', 'in person']),
  answeredBy: printed(requiredText('Who answered', 120)),
  note: text('Note', 500),
})
export type ConditionAnswerInput = z.infer<typeof conditionAnswerSchema>

export const askChangeSchema = consignmentActSchema.extend({
  subject: requiredText('What it is about', 120),
  text: requiredText('What should change', 2_000),
})
export type AskChange = z.infer<typeof askChangeSchema>

/** A shipper has read the manifest. */
export const acknowledgeSchema = z.object({ documentId: rowId, requestId })
export type AcknowledgeDocument = z.infer<typeof acknowledgeSchema>
