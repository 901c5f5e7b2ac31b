import type { Basis, FindingStatus, LimitKind, Verdict } from '@/lib/rules/result'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { FlightPhase, LegKind, Variant } from '@/lib/thermal/scenario'

/*
 * The go/no-go sheet as plain JSON. The assessment page, the sheet on screen and the sheet on paper take this one view, so
 * that no two of them can tell a different story. Built by lib/views/sheet-view/build-sheet-view.ts; figures are raw (°C,
 * minutes, kg), words are finished sentences, and rounding is left to lib/views/format.ts.
 */

/** An instant with the IANA zone it is told in. */
export interface Moment {
  ms: number
  zone: string
}

/** What stands in a stamp. `none` reads "Not assessed"; `outOfDate` puts OUT OF DATE beside the old figures. */
export interface Stamp {
  verdict: Verdict | 'none'
  /** How many conditions the verdict holds on; only with "conditional". */
  conditions: number
  outOfDate: boolean
}

/** Room to the limit that decides. Absent figures are null, never 0. */
export interface Margin {
  /** Whole minutes, rounded down; 240 means 240 or more; negative: minutes of the leg spent past the limit. */
  minutes: number | null
  /** Largest uniform rise (cold side: fall) of outside air that keeps the limit, °C in steps of 0.5. */
  outsideAirC: number | null
  bodyC: number | null
  limitKind: LimitKind | null
  side: 'high' | 'low' | null
}

export type SurroundingsPattern = 'van' | 'shed' | 'ramp' | 'hold' | 'customs' | 'sea' | 'rail' | 'rest'

/** One animal on one leg. */
export interface LegCell {
  animalId: string
  /** null: the animal is not on this leg, or the leg was not evaluated. */
  verdict: Verdict | null
  margin: Margin
  /** The limit the margin is to, e.g. "alarm", "alarm low", "critical"; the rule that decides where there is no margin. */
  limitWords: string
  /** What decides the verdict where that is another thing than the limit of the margin, e.g. "law", "judgement"; else "". */
  decidedWords: string
  overridden: boolean
}

export interface LegView {
  legId: string
  ordinal: number
  kind: LegKind
  flightPhase: FlightPhase | null
  pattern: SurroundingsPattern
  /** "Ramp, Muscat", "Road, Peebles to Edinburgh", "Airborne, Skerrow 316". */
  title: string
  fromPlace: string
  toPlace: string
  start: Moment
  end: Moment
  durationMin: number
  delayTypicalMin: number
  delayWorstMin: number
  /** Planned air outside the crates at the worst end of the leg's series, °C; null where nothing was typed. */
  airTempC: number | null
  /** "van at 16 °C", "outside 27 °C", "hold at 14 °C", "no fresh air known". */
  airWords: string
  carrier: string
  serviceNumber: string
  partyInCharge: string
  partyTelephone: string
  partyHours: string
  attended: boolean
  /** Numbers of the conditions that belong to this leg. */
  conditionNumbers: number[]
  /** In the order of `animals`. */
  cells: LegCell[]
}

export interface AnimalView {
  animalId: string
  crateId: string
  crateLetter: string
  name: string
  count: number
  /** "Dog", "Snub-nosed dog". */
  speciesName: string
  breedNote: string
  sexWords: string
  ageWords: string
  massKg: number | null
  identification: string
  /** "Beagle, bitch, 4 y, 11.2 kg". */
  describes: string
  /** "45 mm, dry. None" */
  coatWords: string
  /** "snub-nosed, juvenile", or "None". */
  flagWords: string
  medicines: string
  /** "calm, crate-trained": what the activity of the run rests on. */
  mannerWords: string
  /** "7 Jun 2026 by A. Vane"; empty where nobody said. */
  examinedWords: string
  lastFed: Moment | null
  lastWatered: Moment | null
  bodyLimits: BodyLimits | null
  stamp: Stamp
  margin: Margin
  /** The finding that decides, in words: "alarm, legs 7 and 8", "alarm low, leg 3", "law, leg 2". */
  decidedWords: string
  /** Ordinals of the legs on which it decides. */
  decidedLegs: number[]
  /** The track that decides. */
  variant: Variant | null
  /** "Heat-prone decides." or "Cold effort 42 %. Cold-prone decides." */
  trackWords: string
  /** Where and when the deciding finding happens. */
  decidedAt: Moment | null
  overridden: boolean
}

export interface BodyLimits {
  criticalLowC: number
  alarmLowC: number
  alarmHighC: number
  criticalHighC: number
  /** "judgement", "sourced", … as the species row says it. */
  confidence: string
}

export type ConditionAnswer = 'waiting' | 'confirmed' | 'refused' | 'ours'

export interface ConditionView {
  number: number
  conditionId: string
  text: string
  /** Leg ordinals; empty: the whole journey. */
  legs: number[]
  legWords: string
  askedOf: string
  askedAt: Moment | null
  /** The rule of the finding it answers; null for a vet's own. */
  findingRule: string | null
  answer: ConditionAnswer
  /** "D. Aird, Wed 10 Jun 16:20 BST, in writing", "Ours is there", "Not yet. Asked Thu 11 Jun 08:50 BST". */
  answerWords: string
  kept: 'kept' | 'broken' | null
  /** True while release waits for it. */
  holdsRelease: boolean
}

export interface FindingView {
  number: number
  /** Index in the assessment's findings of the one shown, the narrowest of its kind. */
  index: number
  /** All findings told in this row: the same rule on other legs or animals with the same answer. */
  indexes: number[]
  rule: string
  basis: Basis
  /** "Physiology", "Law", … */
  basisWords: string
  status: FindingStatus | 'overridden'
  /** "Breach. A vet may override it", "Met", "Unknown. Holds release". */
  statusWords: string
  /** The part of statusWords set in bold, empty when none. */
  statusBold: string
  /** "D, legs 7 and 8", "all". */
  whoLegWords: string
  animalIds: string[]
  legIds: string[]
  asked: string
  citation: string
  /** "judgement", "from memory, check it", "second-hand, check it", "". */
  sourceWords: string
  /** "39.5 °C" */
  givesWords: string
  spareWords: string
  margin: Margin
  note: string
  overridable: boolean
  decides: boolean
}

/** A finding a vet has overridden; stands beside the stamp wherever the stamp stands. */
export interface OverrideView {
  findingIndex: number
  /** In full: "Body at most 39.7 °C, alarm limit, Otto (D), leg 7 (ramp)" */
  findingWords: string
  reason: string
  vetName: string
  signedAt: Moment
  minutesPast: number | null
  worstBodyC: number | null
}

/** A vet’s signature in force, with the record it was checked against. */
export interface ApprovalView {
  vetName: string
  registration: string
  registrationCountry: string
  /** Day, "2027-03-31". */
  registrationExpires: string
  /** "Record checked by admin 14 Jan 2026". */
  checkedWords: string
  signedAt: Moment
  crateMarks: string[]
  /** The statement as signed, word for word. */
  statement: string
  examined: boolean
  /** "Holds while: …"; empty until envelopes exist. */
  envelopeWords: string
}

/** Stop limits of one crate: the strictest of the legs whose planned air lies inside it, and all by leg. */
export interface StopLimitView {
  crateId: string
  crateLetter: string
  /** "2441-A" */
  crateMark: string
  strictest: AirStop
  byLeg: (AirStop & { legId: string; ordinal: number; plannedInside: boolean; overridden: boolean })[]
}

/** Whole °C of air outside the crate, and the same in °F rounded to the safe side (upper down, lower up). */
export interface AirStop {
  aboveC: number | null
  belowC: number | null
  aboveF: number | null
  belowF: number | null
}

export interface EnduranceView {
  animalId: string
  crateLetter: string
  legId: string
  ordinal: number
  kind: 'climate' | 'ventilation' | 'stays'
  worstAt: Moment | null
  /** null: unknown; 240 means 240 or more. */
  toAlarmMin: number | null
  toCriticalMin: number | null
}

/** Charts on one schedule: the one on which the consignment is decided. Minutes count from departure. */
export interface SheetCharts {
  scheduleId: string
  /** "leg 7 at its worst delay", "all legs at their typical delay", "all legs on time". */
  scheduleWords: string
  departureMs: number
  endMin: number
  /** Zones of the journey in the order met, two at most on a ruler. */
  zones: { zone: string; fromMin: number }[]
  legs: ChartLeg[]
  animals: AnimalChart[]
  crates: CrateChart[]
}

export interface ChartLeg {
  legId: string
  ordinal: number
  title: string
  pattern: SurroundingsPattern
  startMin: number
  endMin: number
}

export interface AnimalChart {
  animalId: string
  crateId: string
  crateLetter: string
  name: string
  limits: BodyLimits
  typical: BodyTrack | null
  /** The prone track that decides. */
  deciding: BodyTrack | null
  heat: HeatChart | null
}

export interface BodyTrack {
  variant: Variant
  minutes: number[]
  bodyC: number[]
}

/** Watts per animal on the deciding track, gains positive; the first five sum to storage. */
export interface HeatChart {
  minutes: number[]
  metabolismW: number[]
  conductionW: number[]
  convectionW: number[]
  radiationW: number[]
  evaporationW: number[]
  storageW: number[]
}

export interface CrateChart {
  crateId: string
  variant: Variant
  minutes: number[]
  airTempC: number[]
  relHumidityPct: number[]
  co2Ppm: number[]
}

export interface SheetFirm {
  name: string
  town: string
  deskTelephone: string
  deskHours: string
  zone: string
}

export interface SheetView {
  consignmentId: number
  /** "2441" */
  mark: string
  revision: number
  replacesRevision: number | null
  state: ConsignmentState
  /** "Revision 2, in review. Replaces revision 1." */
  revisionWords: string
  /** Stands on the paper's edge while nothing is released; empty otherwise. */
  edgeWords: string
  /** Eight characters; null on screen, where no paper was made. */
  documentCode: string | null
  made: Moment
  firm: SheetFirm

  from: string
  to: string
  leaves: Moment
  arrives: Moment
  shipper: string
  /** "Skerrow 316"; empty without a flight. */
  flight: string
  animalCount: number
  crateCount: number
  journeyMin: number

  stamp: Stamp
  /** The bold line beside the stamp and the sentences under it. */
  headline: string
  headlineMore: string[]
  margin: Margin
  overrides: OverrideView[]
  /** Signatures in force. */
  approvals: ApprovalView[]

  animals: AnimalView[]
  legs: LegView[]
  conditions: ConditionView[]
  /** "3 isn’t confirmed, so no figure on this sheet counts it"; empty when all are. */
  conditionsWords: string
  stopLimits: StopLimitView[]
  endurance: EnduranceView[]
  /** Every finding, deciding ones first; the paper takes the first that fit and says how many it left out. */
  findings: FindingView[]
  /** null: the assessment was loaded without its tracks, or none exists. */
  charts: SheetCharts | null

  planHash: string
  inputHash: string
  assessed: Moment | null
  assessedBy: string
  /** "typed by I. Quennell", "run of 06:00 UTC, issued 07:40 UTC". */
  weatherWords: string
  /** "engine 1.4.0, rules 2026.05, profiles dog 4, cat 2". */
  versionWords: string
  /** "3 tracks for each animal". */
  runWords: string
  /** Each begins with a bold part, possibly empty. */
  cautions: { bold: string; text: string }[]
}
