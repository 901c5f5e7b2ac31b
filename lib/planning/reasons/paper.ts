import { lettersNotOnPaper, notOnPaperWords } from '@/lib/schemas/paper-letters'
import type { Plan } from '@/lib/schemas/plan'
import type { Timeline } from '../timeline'
import { reason } from './reason'
import type { Reason } from './reason'

/**
 * Texts of the plan that go on the papers and hold a letter the papers cannot show. Said before anybody signs: a name left
 * out or put in other letters would make a document of somebody else, so such papers are never printed.
 */
export function paperReasons(plan: Plan, { legs }: Timeline): Reason[] {
  return [
    ...texts('consignor', plan.consignor, ['name', 'address', 'telephone', 'email']),
    ...texts('consignee', plan.consignee, ['name', 'address', 'telephone', 'email']),
    ...texts('emergencyContact', plan.emergencyContact, ['name', 'telephone']),
    ...text('handlingNote', plan.handlingNote),
    ...plan.animals.flatMap((animal, index) =>
      texts(`animals.${index}`, animal, ['name', 'breedNote', 'identification', 'medicines', 'examinedBy']),
    ),
    ...plan.legs.flatMap((leg, index) => [
      ...text(`legs.${index}.fromPlaceId`, legs[index]?.from?.name ?? '', 'title'),
      ...text(`legs.${index}.toPlaceId`, legs[index]?.to?.name ?? '', 'title'),
      ...texts(`legs.${index}`, leg, ['carrier', 'serviceNumber'], 'title'),
      ...texts(`legs.${index}`, leg, ['partyInCharge', 'partyTelephone', 'partyHours']),
    ]),
  ]
}

type Letters = Parameters<typeof lettersNotOnPaper>[1]

function texts<Field extends string>(
  path: string,
  part: Record<Field, string>,
  fields: readonly Field[],
  letters?: Letters,
): Reason[] {
  return fields.flatMap((field) => text(`${path}.${field}`, part[field], letters))
}

function text(path: string, written: string, letters?: Letters): Reason[] {
  const missing = lettersNotOnPaper(written, letters)
  return missing.length === 0 ? [] : [reason(path, notOnPaperWords(written, missing))]
}
