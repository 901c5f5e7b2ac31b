import {
  ENGINE_VERSION,
  type Leg,
  type ProfileRow,
  type Run,
  type Scenario,
  VARIANTS,
  gather,
} from '@/lib/thermal'
import { outsideAirMargin } from './air-margin'
import { type BaseRuns, GO_MARGIN_C, type Side, makeBaseRuns } from './base-runs'
import { bodyFinding, overrideRefusal } from './body-findings'
import { type BodyJudgement, judgeBody } from './body-judgement'
import { carrierFindings } from './carrier-findings'
import { crateFindings } from './crate-findings'
import { enduranceOf } from './endurance'
import { type DecidedFacts, inputHash } from './hash'
import { judgements } from './judgements'
import { minutesToSpare } from './minutes-to-spare'
import { packFindings } from './packs'
import type { Progress } from './progress'
import type { Assessment, Endurance, Finding, StopLimit } from './result'
import { type Runner, type Steps, createRunner } from './runner'
import { setPointFindings } from './set-point'
import { stopLimitsOf } from './stop-limits'
import { type Prepared, type Subject, isAboard, prepare } from './subject'
import { type Passage, decide } from './verdicts'
import { RULES_VERSION } from './version'
import { compare } from './wording'

export interface AssessOptions {
  /** Names, medicines, carriers and parties, which the hash speaks of besides the scenario. */
  facts?: DecidedFacts
  onProgress?: (progress: Progress) => void
  /** Asked before every run; true ends the assessment with the error `unavailable`. */
  shouldStop?: () => boolean
}

/**
 * Assesses a plan: tracks, findings, margins, endurance, stop limits and verdicts. Pure and the same to the byte wherever
 * it runs. Throws `not_converged` (details: legId, minute) where the engine cannot follow, never a verdict then.
 */
export function assess(
  scenario: Scenario,
  catalogue: Readonly<Record<string, ProfileRow>>,
  options: AssessOptions = {},
): Assessment {
  const steps = assessSteps(scenario, catalogue, options)
  for (;;) {
    const step = steps.next()
    if (step.done) return step.value
    options.onProgress?.(step.value)
  }
}

/** The same work, handing control back after every short run. */
export function* assessSteps(
  given: Scenario,
  catalogue: Readonly<Record<string, ProfileRow>>,
  { facts, shouldStop }: AssessOptions = {},
): Steps<Assessment> {
  const prepared = prepare(given, catalogue)
  const runner = createRunner(prepared, shouldStop)
  const base = yield* makeBaseRuns(prepared, runner, readsEnclosedAir(prepared.scenario))
  const bodies = yield* bodyFindings(prepared, base, runner)
  const findings = ordered([...bodies, ...planFindings(prepared, base, bodies)], prepared)
  const { stopLimits, endurance } = yield* legFigures(prepared, runner, bodies)
  const verdicts = decide(findings, passagesOf(prepared))
  return {
    schema: 'steadfold/result@1',
    ...gather(yield* reported(base, findings, verdicts.animalVerdicts, runner)),
    schedules: base.schedules,
    rulesVersion: RULES_VERSION,
    inputHash: inputHash({
      scenario: given,
      ...(facts && { facts }),
      profiles: prepared.rows,
      engineVersion: ENGINE_VERSION,
      rulesVersion: RULES_VERSION,
    }),
    rulesEvaluated: given.context !== undefined,
    endurance,
    stopLimits,
    findings,
    ...verdicts,
  }
}

/** Rough numbers of runs a leg takes in each stage, for the progress shown; never for the result. */
const EXPECTED = { margins: 16, figures: 40 }

function* bodyFindings(prepared: Prepared, base: BaseRuns, runner: Runner): Steps<Finding[]> {
  const { legs } = prepared.scenario
  runner.stage('Margins', legs.length * EXPECTED.margins)
  const findings: Finding[] = []
  for (const [index, leg] of legs.entries()) {
    runner.at('leg', index + 1, legs.length)
    for (const side of ['high', 'low'] as const) {
      const aboard = prepared.subjects.filter((subject) => isAboard(subject, index))
      const judged = aboard.flatMap((subject) => judgeBody(subject, leg, side, base))
      const keeps = judged.some(({ status }) => status !== 'breach')
      const spare = keeps ? yield* minutesToSpare(prepared, runner, index, side) : new Map<string, number>()
      for (const judgement of judged) findings.push(yield* withMargins(judgement, legs, spare, base, runner))
    }
  }
  return findings
}

function* withMargins(
  judged: BodyJudgement,
  legs: readonly Leg[],
  spare: ReadonlyMap<string, number>,
  base: BaseRuns,
  runner: Runner,
): Steps<Finding> {
  const outsideAirC = yield* outsideAirMargin(judged, base, runner)
  const animalId = judged.subject.animal.id
  const legIds = legs.map(({ id }) => id)
  return bodyFinding(judged, {
    outsideAirC,
    spareMin: spare.get(animalId),
    overrideRefused: overrideRefusal(animalId, legIds, judged.side, base),
    legs,
  })
}

/** Everything besides the body limits: crate air, judgements, and the rules where the plan says whose they are. */
function planFindings(
  { scenario, subjects }: Prepared,
  base: BaseRuns,
  bodies: readonly Finding[],
): Finding[] {
  const crates = subjects.flatMap((subject) =>
    scenario.legs.flatMap((leg, index) =>
      isAboard(subject, index) ? crateFindings(subject, leg, scenario.legs, base) : [],
    ),
  )
  const rules =
    scenario.context === undefined
      ? []
      : [
          ...carrierFindings(scenario, subjects),
          ...packFindings({ scenario, context: scenario.context, subjects, base, holdsWithMargin }),
        ]
  function holdsWithMargin({ animal }: Subject, legId: string): boolean {
    return bodies
      .filter((finding) => finding.animalId === animal.id && finding.legId === legId)
      .every(({ status, marginOutsideAirC = 0 }) => status !== 'breach' && marginOutsideAirC >= GO_MARGIN_C)
  }
  return [...crates, ...judgements(scenario, subjects, base), ...setPointFindings(scenario, base), ...rules]
}

function* legFigures(
  prepared: Prepared,
  runner: Runner,
  bodies: readonly Finding[],
): Steps<{ stopLimits: StopLimit[]; endurance: Endurance[] }> {
  const { legs } = prepared.scenario
  runner.stage('Endurance and stop limits', legs.length * EXPECTED.figures)
  const stopLimits: StopLimit[] = []
  const endurance: Endurance[] = []
  for (const index of legs.keys()) {
    runner.at('leg', index + 1, legs.length)
    stopLimits.push(...(yield* stopLimitsOf(prepared, runner, index, bodies)))
    endurance.push(...(yield* enduranceOf(prepared, runner, index)))
  }
  return { stopLimits, endurance }
}

/** By animal, then leg in order of the journey, then rule: whole-journey findings stand behind those of legs. */
function ordered(findings: readonly Finding[], { scenario }: Prepared): Finding[] {
  const place = new Map(scenario.legs.map(({ id }, index) => [id, index]))
  const legOf = ({ legId }: Finding) => (legId === undefined ? scenario.legs.length : (place.get(legId) ?? 0))
  const side = (finding: Finding): Side | '' => finding.side ?? ''
  return [...findings].sort(
    (a, b) =>
      compare(a.animalId ?? '~', b.animalId ?? '~') ||
      compare(a.crateId ?? '~', b.crateId ?? '~') ||
      legOf(a) - legOf(b) ||
      compare(a.rule, b.rule) ||
      compare(side(a), side(b)),
  )
}

function passagesOf({ scenario, subjects }: Prepared): Passage[] {
  return subjects.map(({ animal, crate, firstLeg, lastLeg }) => ({
    animalId: animal.id,
    crateId: crate.id,
    legIds: scenario.legs.slice(firstLeg, lastLeg + 1).map(({ id }) => id),
  }))
}

/** Tracks kept: all variants on time, and on whichever other schedule decides for an animal. */
function* reported(
  base: BaseRuns,
  findings: readonly Finding[],
  decided: readonly { decidedBy?: number }[],
  runner: Runner,
): Steps<Run[]> {
  const deciding = decided.map(({ decidedBy = -1 }) => findings[decidedBy]?.scheduleId ?? 'on-time')
  const wanted = new Set(['on-time', ...deciding])
  const runs: Run[] = []
  for (const { id: scheduleId } of base.schedules.filter(({ id }) => wanted.has(id)))
    for (const variant of VARIANTS) runs.push(yield* runner.journey({ scheduleId, variant, tracks: true }))
  return runs
}

/** Only the law reads the computed air of a vehicle or hold by the minute. */
function readsEnclosedAir({ context, legs }: Scenario): boolean {
  return context !== undefined && legs.some(({ surroundings }) => surroundings.type === 'enclosed')
}
