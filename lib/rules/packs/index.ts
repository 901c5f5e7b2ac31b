import type { Finding } from '../result'
import { isAboard } from '../subject'
import { list, speciesWords } from '../wording'
import { type LawView, type RulePack, legsUnder } from './pack'
import { EU_PACK, GB_PACK } from './eu-1-2005'
import { US_9CFR_3 } from './us-9cfr-3'

/** All packs in this version. */
export const PACKS: readonly RulePack[] = [US_9CFR_3, EU_PACK, GB_PACK]

/**
 * Findings of every pack, and one for each country or species that no pack speaks of: a law nobody has written down here
 * is said to be unknown, never passed over.
 */
export function packFindings(view: LawView): Finding[] {
  return [...PACKS.flatMap((pack) => pack.evaluate(view)), ...silentCountries(view), ...silentSpecies(view)]
}

const shared = { basis: 'law', status: 'unknown', sourceTag: 'judgement', overridable: false } as const

function silentCountries({ scenario, context }: LawView): Finding[] {
  const named = scenario.legs
    .flatMap(({ place }) => [place?.fromCountry, place?.toCountry])
    .filter((code) => code !== undefined)
  const codes = [...new Set([...context.jurisdictions, ...named])].sort()
  const silent = codes.filter((code) => !PACKS.some(({ countries }) => countries.includes(code)))
  return silent.map((code) => ({
    ...shared,
    rule: `law-not-held-${code.toLowerCase()}`,
    asked: `The rules of ${code} on live animals.`,
    note: `This version holds no rules of ${code}: ask the authority.`,
  }))
}

function silentSpecies(view: LawView): Finding[] {
  return PACKS.flatMap((pack) => {
    const legs = legsUnder(view, pack.countries)
    const others = view.subjects.filter(
      (subject) =>
        !pack.profiles.includes(subject.animal.profile) && legs.some((index) => isAboard(subject, index)),
    )
    const profiles = [...new Set(others.map(({ animal }) => animal.profile))].sort()
    return others.map(({ animal, crate }) => ({
      ...shared,
      rule: `${pack.id}-species-not-held`,
      animalId: animal.id,
      crateId: crate.id,
      asked: `The rules of ${pack.placeWords} for a ${speciesWords(animal.profile)}.`,
      note: `${pack.title} is held here for ${list(pack.profiles.map(speciesWords))} only, not for ${list(profiles.map(speciesWords))}: ask the authority.`,
    }))
  })
}
