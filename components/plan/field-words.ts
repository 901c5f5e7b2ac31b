import type { Plan } from '@/lib/schemas/plan'
import {
  BEDDING_WORDS,
  FACE_WORDS,
  FLAG_WORDS,
  FLOOR_WORDS,
  FORM_WORDS,
  KIND_WORDS,
  ONTO_WORDS,
  OPENING_WORDS,
  PHASE_WORDS,
  PURPOSE_WORDS,
  SEX_WORDS,
  STOP_WORDS,
  SURROUNDINGS_WORDS,
  TEMPERAMENT_WORDS,
} from './option-words'

/** What a field is called and which unit stands in it, by the last words of its path. */
const FIELDS: Record<string, [words: string, unit?: string]> = {
  animals: ['Animals'],
  crates: ['Crates'],
  legs: ['Legs'],
  shipperId: ['Shipper'],
  purpose: ['Purpose'],
  handlingNote: ['Handling note'],
  name: ['Name'],
  address: ['Address'],
  telephone: ['Telephone'],
  email: ['E-mail'],
  profileKey: ['Species'],
  breedNote: ['Breed'],
  identification: ['Identification'],
  sex: ['Sex'],
  ageDays: ['Age', 'days'],
  massKg: ['Mass', 'kg'],
  count: ['How many'],
  temperament: ['Temperament'],
  crateTrained: ['Crate-trained'],
  'coat.depthMm': ['Coat depth', 'mm'],
  'coat.clipped': ['Coat clipped'],
  'coat.wetPct': ['Coat wet', '%'],
  flags: ['Flags'],
  medicines: ['Medicines'],
  examinedOn: ['Examined on'],
  examinedBy: ['Examined by'],
  lastFedLocal: ['Last fed'],
  lastWateredLocal: ['Last watered'],
  letter: ['Letter'],
  crateModelId: ['Crate model'],
  form: ['Form'],
  lengthCm: ['Length inside', 'cm'],
  widthCm: ['Width', 'cm'],
  heightCm: ['Height', 'cm'],
  wallMaterial: ['Wall'],
  wallThicknessMm: ['Wall thickness', 'mm'],
  rimMm: ['Rim', 'mm'],
  floorMaterial: ['Floor'],
  floorThicknessMm: ['Floor thickness', 'mm'],
  floorOnto: ['Floor stands'],
  'bedding.material': ['Bedding'],
  'bedding.depthMm': ['Bedding depth', 'mm'],
  'bedding.wetPct': ['Bedding wet', '%'],
  waterContainerL: ['Water container', 'L'],
  openings: ['Openings'],
  occupants: ['Animals inside'],
  face: ['Wall'],
  kind: ['Kind'],
  howMany: ['How many'],
  sillHeightCm: ['Sill above floor', 'cm'],
  meshOpenPct: ['Mesh open', '%'],
  blockedPct: ['Blocked', '%'],
  flightPhase: ['Part of the flight'],
  fromPlaceId: ['From'],
  toPlaceId: ['To'],
  startLocal: ['Start'],
  startOffsetMin: ['Start, which of two hours', 'min'],
  endLocal: ['End'],
  endOffsetMin: ['End, which of two hours', 'min'],
  carrier: ['Carrier'],
  serviceNumber: ['Number'],
  pressureKPa: ['Pressure', 'kPa'],
  outOfCrate: ['Animals out of the crate'],
  partyInCharge: ['Party in charge'],
  partyTelephone: ['Telephone'],
  partyHours: ['Hours'],
  attended: ['One of ours is there'],
  driverId: ['Who of ours'],
  delayTypicalMin: ['Delay, typical', 'min'],
  delayWorstMin: ['Delay, worst', 'min'],
  stops: ['Stops'],
  lastPointOfReturn: ['Last point of return'],
  fallback: ['Fallback kennel or vet'],
  note: ['Note'],
  type: ['Surroundings'],
  airTempC: ['Air temperature', '°C'],
  relHumidityPct: ['Humidity', '%'],
  airSpeedMs: ['Air speed at the crates', 'm/s'],
  crateAirSpeedMs: ['Air speed at the crates', 'm/s'],
  windMs: ['Wind', 'm/s'],
  solarWm2: ['Sun', 'W/m²'],
  minute: ['Minute', 'min'],
  shadePct: ['Shade', '%'],
  spaceName: ['Name of the space'],
  volumeM3: ['Volume', 'm³'],
  heatTransferWK: ['Through walls', 'W/K'],
  interiorMassKJK: ['Inside mass', 'kJ/K'],
  ventilationM3h: ['Fresh air', 'm³/h'],
  leakageM3h: ['Leakage', 'm³/h'],
  solarApertureM2: ['Sunlit glass', 'm²'],
  initialAirTempC: ['Air at the start', '°C'],
  setPointC: ['Set-point', '°C'],
  coolingW: ['Cooling', 'W'],
  heatingW: ['Heating', 'W'],
  conditioning: ['Cooling and heating'],
  outside: ['What lies outside'],
  rows: ['Weather rows'],
}

const PARTIES: Record<string, string> = {
  consignor: 'Consignor',
  consignee: 'Consignee',
  emergencyContact: 'Emergency contact',
}

/** "Crate B, bedding depth", "Leg 6, air temperature": a field as people would ask for it. */
export function fieldWords(plan: Plan, path: string): string {
  const keys = path.split('.')
  const label = labelOf(keys)
  const owner = ownerOf(plan, keys)
  if (owner === '') return label
  return label === '' ? owner : `${owner}, ${label.toLowerCase()}`
}

function labelOf(keys: readonly string[]): string {
  // A whole animal, crate, leg or row: whose it is says enough.
  if (keys.length > 1 && /^\d+$/.test(keys.at(-1) ?? '')) return ''
  const named = keys.filter((key) => !/^\d+$/.test(key))
  return FIELDS[named.slice(-2).join('.')]?.[0] ?? FIELDS[named.at(-1) ?? '']?.[0] ?? ''
}

/** Whose field it is: "Crate B", "Leg 6", "Consignor"; empty for the plan's own. */
export function ownerWords(plan: Plan, path: string): string {
  return ownerOf(plan, path.split('.'))
}

function ownerOf(plan: Plan, keys: readonly string[]): string {
  const [head = '', position] = keys
  const index = Number(position)
  if (head in PARTIES) return PARTIES[head] ?? ''
  if (position === undefined) return ''
  if (head === 'animals') return plan.animals[index]?.name || `Animal ${index + 1}`
  if (head === 'crates') {
    const opening = keys[2] === 'openings' && keys[3] !== undefined ? `, opening ${Number(keys[3]) + 1}` : ''
    return `Crate ${plan.crates[index]?.letter ?? index + 1}${opening}`
  }
  if (head === 'legs') {
    const row = keys.indexOf('rows')
    const place = row > 0 && keys[row + 1] !== undefined ? `, weather row ${Number(keys[row + 1]) + 1}` : ''
    return `Leg ${index + 1}${place}`
  }
  return ''
}

const CHOICES: Record<string, Record<string, string>> = {
  purpose: PURPOSE_WORDS,
  sex: SEX_WORDS,
  temperament: TEMPERAMENT_WORDS,
  form: FORM_WORDS,
  wallMaterial: FLOOR_WORDS,
  floorMaterial: FLOOR_WORDS,
  floorOnto: ONTO_WORDS,
  material: BEDDING_WORDS,
  face: FACE_WORDS,
  flightPhase: PHASE_WORDS,
  type: SURROUNDINGS_WORDS,
  kind: { ...KIND_WORDS, ...OPENING_WORDS, ...STOP_WORDS },
  flags: FLAG_WORDS,
}

/** Names that stand behind numbers in the plan. */
export interface NamesInPlan {
  places: readonly { id: number; name: string }[]
  drivers: readonly { id: number; name: string }[]
  shippers: readonly { id: number; name: string }[]
  crateModels: readonly { id: number; name: string }[]
  species: readonly { key: string; commonName: string }[]
}

/** A value as the page would show it: "40 mm", "Wood shavings", "Yes", "2 openings", "nothing". */
export function valueWords(path: string, value: unknown, names: NamesInPlan): string {
  const key =
    path
      .split('.')
      .filter((part) => !/^\d+$/.test(part))
      .at(-1) ?? ''
  if (value === null || value === undefined || value === '') return 'nothing'
  if (typeof value === 'boolean') return value ? 'Yes' : 'No'
  const named = nameBehind(key, value, names)
  if (named !== null) return named
  if (typeof value === 'number') return withFieldUnit(path, value)
  if (typeof value === 'string') return CHOICES[key]?.[value] ?? value.replace(/^(\d{4}-\d\d-\d\d)T/, '$1 ')
  if (Array.isArray(value)) {
    const words = value.map((item) => (typeof item === 'string' ? (CHOICES[key]?.[item] ?? item) : null))
    return words.every((word) => word !== null) && words.length > 0
      ? words.join(', ')
      : `${value.length} rows`
  }
  return 'as entered'
}

/** The unit of the field at a path; undefined where it holds no figure with one. */
export function fieldUnit(path: string): string | undefined {
  const named = path.split('.').filter((part) => !/^\d+$/.test(part))
  return FIELDS[named.slice(-2).join('.')]?.[1] ?? FIELDS[named.at(-1) ?? '']?.[1]
}

function withFieldUnit(path: string, value: number): string {
  const unit = fieldUnit(path)
  const figure = String(value).replace('-', '−')
  return unit === undefined ? figure : `${figure}\u00a0${unit}`
}

function nameBehind(key: string, value: unknown, names: NamesInPlan): string | null {
  const byId = (rows: readonly { id: number; name: string }[]) =>
    rows.find(({ id }) => id === value)?.name ?? null
  switch (key) {
    case 'fromPlaceId':
    case 'toPlaceId':
      return byId(names.places)
    case 'driverId':
      return byId(names.drivers)
    case 'shipperId':
      return byId(names.shippers)
    case 'crateModelId':
      return byId(names.crateModels)
    case 'profileKey':
      return names.species.find((row) => row.key === value)?.commonName ?? null
    default:
      return null
  }
}
