import { randomUUID } from 'node:crypto'
import { ASSESSED_AT } from './clock'
import { recordAssessment } from '@/lib/domain/assessments/record'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { saveConsignment } from '@/lib/domain/consignments/save'
import type { SavedPlan } from '@/lib/domain/consignments/save'
import { submitConsignment } from '@/lib/domain/consignments/submit'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { recordRelease } from '@/lib/domain/release/record'
import { actorOf } from '@/lib/auth/sign-in'
import { emptyPlan, newAnimal, newCrate, newLeg } from '@/lib/planning/new-plan'
import type { Actor } from '@/lib/policies/actor'
import type { Assessment, Finding } from '@/lib/rules/result'
import { decide } from '@/lib/rules/verdicts'
import type { ApproveCrates } from '@/lib/schemas/approval'
import type { Plan } from '@/lib/schemas/plan'
import { models } from '@/models'
import type { User } from '@/models'
import { cast, PASSWORD } from '../support/cast'
import type { Cast } from '../support/cast'
import { make } from '../support/factories'

/* A small firm on the day before two dogs leave Balfron for the airport at Glasgow. Everybody is invented. */

export { NOW, later } from './clock'

export interface World {
  people: Cast
  as: (person: keyof Cast) => Actor
  plan: Plan
}

/** The cast, two places, and a plan of two dogs in two crates on two legs that can be assessed. */
export async function world(): Promise<World> {
  const people = await cast()
  const kennel = await make.place({ name: 'Balfron Lodge Kennels', kind: 'kennel' })
  const shed = await make.place({ name: 'Glasgow Airport animal shed', kind: 'airport' })
  return {
    people,
    as: (person) => actorOf(people[person] as User, '192.0.2.7'),
    plan: twoDogs(people, kennel.id, shed.id),
  }
}

function twoDogs(people: Cast, kennelId: number, shedId: number): Plan {
  const plan = emptyPlan(people.shipper.shipperId ?? 0)
  plan.consignor = {
    name: 'Balfron Lodge Kennels',
    address: '3 Mill Brae',
    telephone: '+44 141 496 0207',
    email: '',
  }
  plan.consignee = { name: 'Bajja House Boarding', address: 'Marsaxlokk', telephone: '', email: '' }
  plan.emergencyContact = { name: 'J. Strand-Ekdahl', telephone: '+44 7700 900562' }
  for (const [name, massKg] of [
    ['Moss', 18.6],
    ['Corrie', 11.2],
  ] as const) {
    plan.animals.push({
      ...newAnimal(plan),
      name,
      massKg,
      profileKey: 'dog',
      breedNote: 'Border collie',
      identification: `Chip 999 000 0131 7740${plan.animals.length}`,
      crateTrained: true,
      temperament: 'calm',
    })
  }
  for (const animal of plan.animals) {
    plan.crates.push({
      ...newCrate(plan, null),
      lengthCm: 100,
      widthCm: 65,
      heightCm: 75,
      occupants: [animal.id],
      openings: [
        {
          id: 'opening-1',
          face: 'front',
          kind: 'door',
          widthCm: 50,
          heightCm: 60,
          howMany: 1,
          sillHeightCm: 5,
          meshOpenPct: 70,
          blockedPct: 0,
        },
        {
          id: 'opening-2',
          face: 'back',
          kind: 'slats',
          widthCm: 50,
          heightCm: 4,
          howMany: 6,
          sillHeightCm: 40,
          meshOpenPct: 100,
          blockedPct: 0,
        },
      ],
    })
  }
  const outside = {
    type: 'open-air' as const,
    rows: [{ minute: 0, airTempC: 15, relHumidityPct: 65, windMs: 2, solarWm2: 200 }],
    shadePct: 0,
  }
  const road = newLeg(plan, 'road')
  if (road.surroundings.type !== 'enclosed') throw new Error('A road leg is offered a van.')
  plan.legs.push({
    ...road,
    fromPlaceId: kennelId,
    toPlaceId: shedId,
    startLocal: '2026-06-10T10:00',
    endLocal: '2026-06-10T11:00',
    surroundings: {
      ...road.surroundings,
      outside,
      conditioning: { setPointC: 18, coolingW: 2_000, heatingW: 2_000 },
    },
    partyInCharge: 'Corran Animal Couriers',
    attended: true,
    driverId: people.driver.id,
    delayTypicalMin: 10,
    delayWorstMin: 40,
  })
  plan.legs.push({
    ...newLeg(plan, 'shed'),
    toPlaceId: shedId,
    endLocal: '2026-06-10T13:00',
    surroundings: { type: 'controlled', airTempC: 18, relHumidityPct: 55, airSpeedMs: 0.1, outside },
    partyInCharge: 'Skerrow Air Cargo',
    partyTelephone: '+44 141 496 0433',
    delayTypicalMin: 10,
    delayWorstMin: 60,
  })
  return plan
}

export const act = () => ({ requestId: randomUUID() })

/** A new consignment of this plan. */
export function saved({ as, plan }: World, now: Date): Promise<SavedPlan> {
  return saveConsignment(as('dispatcher'), { ...act(), consignmentId: null, version: null, plan }, now)
}

/** What the engine might have found: every animal well inside its limits on every leg, and whatever a test adds. */
export function foundWell(plan: Plan, more: Finding[] = []): Assessment {
  const passages = plan.crates.flatMap((crate) =>
    crate.occupants.map((animalId) => ({
      animalId,
      crateId: crate.id,
      legIds: plan.legs.map(({ id }) => id),
    })),
  )
  const well = passages.flatMap(({ animalId, legIds }) => legIds.map((legId) => met(animalId, legId)))
  const findings = [...more, ...well]
  return {
    schema: 'steadfold/result@1',
    engineVersion: '1.0.0',
    rulesVersion: '1.0.0',
    inputHash: '0'.repeat(64),
    rulesEvaluated: true,
    schedules: [{ id: 'on-time', legStartMin: [0, 60, 180] }],
    crates: [],
    animals: [],
    compartments: [],
    closure: { maxResidualW: 0, energyErrorPct: 0 },
    finalState: [],
    endurance: [],
    stopLimits: [],
    findings,
    ...decide(findings, passages),
  }
}

export function met(animalId: string, legId: string): Finding {
  return {
    rule: 'core-alarm-high',
    basis: 'physiology',
    status: 'met',
    limitKind: 'alarm',
    side: 'high',
    animalId,
    legId,
    marginMin: 240,
    marginOutsideAirC: 9,
    marginBodyC: 0.9,
    note: 'Stays inside the alarm limit.',
    asked: 'Body at most 39.7 °C, alarm',
    sourceTag: 'judgement',
    overridable: true,
  }
}

/** An alarm limit passed: a vet may override it, by name. */
export function breach(plan: Plan, more: Partial<Finding> = {}): Finding {
  return {
    ...met(plan.animals[0]?.id ?? '', plan.legs[0]?.id ?? ''),
    status: 'breach',
    marginMin: -12,
    marginOutsideAirC: -1,
    marginBodyC: -0.2,
    minutesPast: 12,
    worstBodyC: 39.9,
    note: 'Passes the alarm limit for 12 minutes.',
    ...more,
  }
}

/** Asks for the assessment and records what was found. */
export async function assessed(place: World, consignmentId: number, now: Date, more: Finding[] = []) {
  const { assessmentId } = await assessConsignment(place.as('dispatcher'), { ...act(), consignmentId }, now)
  await recordAssessment({ assessmentId, result: foundWell(place.plan, more) }, ASSESSED_AT(now))
  return assessmentId
}

export async function inReview(place: World, now: Date, more: Finding[] = []): Promise<SavedPlan> {
  const plan = await saved(place, now)
  await assessed(place, plan.consignmentId, now, more)
  await submitConsignment(place.as('dispatcher'), { ...act(), consignmentId: plan.consignmentId }, now)
  return plan
}

/** What a vet sends to sign all crates of the plan as it stands. */
export async function signature(
  place: World,
  consignmentId: number,
  more: Partial<ApproveCrates> = {},
): Promise<ApproveCrates> {
  const row = await models.Consignment.findByPk(consignmentId, { rejectOnEmpty: true })
  return {
    ...act(),
    consignmentId,
    crateIds: place.plan.crates.map(({ id }) => id),
    planHash: row.planHash ?? '',
    password: PASSWORD,
    examined: true,
    conditions: [],
    earlySigns: place.plan.crates.map(({ id, letter }) => ({ crateId: id, text: `Pants in ${letter}` })),
    overrides: [],
    ...more,
  }
}

export async function approved(place: World, now: Date): Promise<SavedPlan> {
  const plan = await inReview(place, now)
  await approveCrates(place.as('vet'), await signature(place, plan.consignmentId), now)
  return plan
}

/** Released as the worker records it, with papers of a few bytes: what is sealed into them is tested elsewhere. */
export async function released(place: World, now: Date): Promise<SavedPlan> {
  const plan = await approved(place, now)
  await recordPapers(place, plan.consignmentId, now)
  return plan
}

let papers = 0

export async function recordPapers(place: World, consignmentId: number, now: Date) {
  const row = await models.Consignment.findByPk(consignmentId, { rejectOnEmpty: true })
  const task = {
    consignmentId,
    revision: row.revision,
    planHash: row.planHash ?? '',
    actorId: place.people.dispatcher.id,
  }
  const paper = (kind: 'manifest' | 'go_no_go') => {
    papers += 1
    return {
      kind,
      code: codeOf(papers),
      bytes: Buffer.from(`%PDF-1.7 ${randomUUID()}`),
      pages: 2,
      view: { papers },
    }
  }
  const letter = {
    to: 'j.strand@example.org',
    subject: 'Manifest',
    text: 'Attached.',
    html: '<p>Attached.</p>',
  }
  const readAt = { version: row.version, updatedAt: row.updatedAt }
  return recordRelease({ task, readAt }, { papers: [paper('manifest'), paper('go_no_go')], letter }, now)
}

function codeOf(n: number): string {
  const letters = 'ABCDEFGHJKLMNPQRSTUVWXYZ23456789'
  return Array.from({ length: 8 }, (_, place) => letters[Math.floor(n / letters.length ** place) % 32]).join(
    '',
  )
}

/** The error a promise is refused with, as plain data. */
export async function refusal(promise: Promise<unknown>): Promise<{
  code: string
  message: string
  details: Record<string, unknown>
  issues: { path: string; message: string }[]
}> {
  try {
    await promise
  } catch (error) {
    if (error instanceof Error && 'code' in error) return error as never
    throw error
  }
  throw new Error('It was not refused.')
}
