import 'server-only'
import type { Transaction } from 'sequelize'
import type { PlanningKnowledge } from '@/lib/planning/reasons'
import type { Timeline } from '@/lib/planning/timeline'
import type { Plan } from '@/lib/schemas/plan'
import { models } from '@/models'

/** What the board shows of a plan without loading it. */
export function boardFigures(plan: Plan, timeline: Timeline, { profiles }: PlanningKnowledge) {
  return {
    departsAt: timeline.departureMs === null ? null : new Date(timeline.departureMs),
    departsZone: timeline.departureZone,
    arrivesAt: timeline.arrivalMs === null ? null : new Date(timeline.arrivalMs),
    arrivesZone: timeline.arrivalZone,
    fromPlaceName: timeline.legs[0]?.from?.name ?? null,
    toPlaceName: timeline.legs.at(-1)?.to?.name ?? null,
    animalsSummary: animalsSummary(plan, new Map(profiles.map(({ key, commonName }) => [key, commonName]))),
  }
}

/** "2 × dog, 1 × rabbit": trade names rarely have a plural a program could guess. */
function animalsSummary(plan: Plan, names: ReadonlyMap<string, string>): string {
  const counts = new Map<string, number>()
  for (const { profileKey, count } of plan.animals) {
    const name = (names.get(profileKey) ?? 'animal').toLowerCase()
    counts.set(name, (counts.get(name) ?? 0) + count)
  }
  return [...counts]
    .map(([name, count]) => `${count} × ${name}`)
    .join(', ')
    .slice(0, 200)
}

/** Writes down every word by which a consignment can be found. */
export async function writeWords(
  tx: Transaction,
  consignmentId: number,
  plan: Plan,
  more: { mark: string; shipperName: string; timeline: Timeline },
): Promise<void> {
  const texts = [
    more.mark,
    more.shipperName,
    plan.consignor.name,
    plan.consignee.name,
    ...plan.animals.flatMap((animal) => [
      animal.name,
      animal.breedNote,
      animal.identification,
      animal.profileKey.replaceAll('-', ' '),
    ]),
    ...plan.legs.flatMap((leg) => [leg.carrier, leg.serviceNumber]),
    ...more.timeline.legs.flatMap(({ from, to }) => [from?.name ?? '', to?.name ?? '']),
  ]
  const words = [...new Set(texts.flatMap(searchWords))]
  await models.ConsignmentWord.destroy({ where: { consignmentId }, transaction: tx })
  await models.ConsignmentWord.bulkCreate(
    words.map((word) => ({ word, consignmentId })),
    { transaction: tx },
  )
}

/** Letters and digits in lower case and without accents: "Łódź" is found by "lodz", and by "łódź". */
export function searchWords(text: string): string[] {
  return text
    .toLowerCase()
    .replaceAll('ł', 'l')
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word !== '')
    .map((word) => word.slice(0, 40))
}
