import type { FieldIssue } from '@/lib/errors'
import type { PlanAnimal, PlanCrate, PlanLeg } from '@/lib/schemas/plan'
import type { ProfileValues } from '@/lib/thermal/scenario'

/** Why a plan cannot be assessed: where in the plan, and one sentence. */
export type Reason = FieldIssue

/** What the reasons must know of a species row in force. */
export interface ProfileInForce {
  key: string
  commonName: string
  version: number
  values: ProfileValues
}

export function reason(path: string, message: string): Reason {
  return { path, message }
}

/** "Bramble", or "Animal 2" while it has no name. */
export function animalWords(animal: Pick<PlanAnimal, 'name'>, index: number): string {
  return animal.name.trim() === '' ? `Animal ${index + 1}` : animal.name
}

export function crateWords(crate: Pick<PlanCrate, 'letter'>): string {
  return `Crate ${crate.letter}`
}

const KIND_WORDS: Record<PlanLeg['kind'], string> = {
  road: 'road',
  shed: 'shed',
  ramp: 'ramp',
  flight: 'flight',
  sea: 'sea',
  rail: 'rail',
  border: 'border post',
  rest: 'rest stop',
}

/** "Leg 3 (ramp)". */
export function legWords(leg: Pick<PlanLeg, 'kind'>, index: number): string {
  return `Leg ${index + 1} (${KIND_WORDS[leg.kind]})`
}

/** A number in running text: true minus, no trailing dust. */
export function spell(value: number): string {
  return String(Number(value.toPrecision(6))).replace('-', '−')
}
