import type { RuleSource } from '../pack'

/** Regulation (EC) No 1/2005, applied since 5 January 2007, and the same text as kept in Great Britain. */
const since = (text: string) => [{ from: '2007-01-05', text }]

export interface TransportRegulation {
  id: string
  title: string
  placeWords: string
  countries: readonly string[]
  sources: Record<'young' | 'pregnant' | 'sedatives' | 'food' | 'water' | 'air', RuleSource>
}

export const EU_1_2005: TransportRegulation = regulation(
  'eu-1-2005',
  'Regulation (EC) No 1/2005',
  'Regulation (EC) No 1/2005',
  'the European Union',
  'AT BE BG HR CY CZ DK EE FI FR DE GR HU IE IT LV LT LU MT NL PL PT RO SK SI ES SE'.split(' '),
)

export const GB_1_2005: TransportRegulation = regulation(
  'gb-1-2005',
  'Regulation (EC) No 1/2005 as retained in Great Britain',
  'Retained Regulation (EC) No 1/2005',
  'Great Britain',
  ['GB'],
)

function regulation(
  id: string,
  title: string,
  cited: string,
  placeWords: string,
  countries: readonly string[],
): TransportRegulation {
  const source = (rule: string, place: string, tag: RuleSource['tag']): RuleSource => ({
    rule: `${id}-${rule}`,
    citations: since(`${cited}, ${place}`),
    tag,
  })
  return {
    id,
    title,
    placeWords,
    countries,
    sources: {
      young: source('young', 'Annex I Chapter I 2', 'seen'),
      pregnant: source('pregnant', 'Annex I Chapter I 2', 'seen'),
      sedatives: source('sedatives', 'Annex I Chapter I 5', 'seen'),
      food: source('food', 'Annex I Chapter V 2.2', 'memory'),
      water: source('water', 'Annex I Chapter V 2.2', 'memory'),
      air: source('air', 'Annex I Chapter II 4.1', 'memory'),
    },
  }
}
