import { clock, minutesToSpare, zoneName } from '@/lib/views/format'
import type { AnimalChart, AnimalView, SheetView } from '@/lib/views/sheet'
import type { ChosenCorridors } from './corridor-picture'

/* Which animal and leg the corridors of a sheet dwell on, the same on the page and on paper. */

/** The animal with the worst verdict, then the least room. */
export function decidingAnimal({ animals }: Pick<SheetView, 'animals'>): AnimalView | null {
  const rank = { 'no-go': 0, conditional: 1, go: 2, none: 3 } as const
  const order = [...animals].sort(
    (a, b) => rank[a.stamp.verdict] - rank[b.stamp.verdict] || roomOf(a) - roomOf(b),
  )
  return order[0] ?? null
}

function roomOf({ margin: { outsideAirC, minutes } }: AnimalView): number {
  return (outsideAirC ?? 99) * 1000 + (minutes ?? 999)
}

/** The leg on which that animal is decided. */
export function decidedLegId({ legs }: SheetView, decider: AnimalView | null): string | null {
  const ordinal = decider?.decidedLegs[0]
  return legs.find((leg) => leg.ordinal === ordinal)?.legId ?? null
}

/** Only for NO-GO and for the narrowest GO WITH CONDITIONS. */
export function calloutOf(decider: AnimalView | null): ChosenCorridors['callout'] {
  if (decider === null || decider.margin.minutes === null) return null
  const { verdict } = decider.stamp
  if (verdict !== 'no-go' && verdict !== 'conditional') return null
  const at = decider.decidedAt
  return {
    verdict,
    figure: minutesToSpare(decider.margin.minutes),
    title: decider.decidedWords.split(',')[0] ?? '',
    text: at === null ? '' : `at ${clock(at.ms, at.zone)} ${zoneName(at.ms, at.zone)}`,
  }
}

/** One line that says which tracks are drawn, and whose critical low limit the picture leaves out. */
export function corridorExplanation(cut: string[], animals: AnimalChart[]): string {
  const tracks =
    'Three tracks are run for each animal: thin line typical; thick line the heat-prone or the cold-prone one, whichever decides; the other isn’t drawn.'
  if (cut.length === 0) return tracks
  const who = cut.length === animals.length ? '' : `${cut.join(', ')}: `
  return `${tracks} ${who}${who === '' ? 'Critical' : 'critical'} low lies below the picture.`
}
