import { type RulePack, legsUnder, subjectsUnder } from '../pack'
import { acclimationFindings } from './acclimation'
import { careFindings } from './care'
import { conveyanceFindings } from './conveyance'
import { enclosureFindings } from './enclosure'
import { feedingFindings } from './feeding'
import { numbersFindings } from './numbers'
import { CATS, DOGS } from './sources'
import { temperatureFindings } from './temperature'
import { isAboard } from '../../subject'

const COUNTRIES = ['US']
const PROFILES = [...DOGS, ...CATS]

/** United States: Animal Welfare Act regulations for dogs and cats in transport. */
export const US_9CFR_3: RulePack = {
  id: 'us-9cfr-3',
  title: '9 CFR Part 3 Subpart A',
  asOf: '2024-11-15',
  placeWords: 'the United States',
  countries: COUNTRIES,
  profiles: PROFILES,
  evaluate(view) {
    const legs = legsUnder(view, COUNTRIES)
    return subjectsUnder(view, PROFILES, legs).flatMap((subject) => {
      const aboard = legs.filter((index) => isAboard(subject, index))
      return [
        ...temperatureFindings(view, subject, aboard),
        ...conveyanceFindings(view, subject, aboard),
        ...acclimationFindings(view, subject),
        ...enclosureFindings(view, subject),
        ...numbersFindings(view, subject, aboard),
        ...feedingFindings(view, subject),
        ...careFindings(view, subject, aboard),
      ]
    })
  },
}
