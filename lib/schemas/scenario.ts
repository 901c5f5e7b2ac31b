import { z } from 'zod'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import type { ProfileRow, Scenario } from '@/lib/thermal/scenario'
import { journeyIssues, type ScenarioIssue } from './scenario/checks'
import { contextSchema, initialStateSchema, limitChangeSchema } from './scenario/context'
import { crateSchema } from './scenario/crate'
import { figureOr } from './scenario/figure'
import { eitherInstant, instantMs, instantText } from './scenario/instant'
import { legSchema } from './scenario/leg'
import { profileRowSchema } from './scenario/profile'
import type { Same } from './scenario/same'

export type { ScenarioIssue }

export type ParsedScenario = { ok: true; scenario: Scenario } | { ok: false; issues: ScenarioIssue[] }

/**
 * A scenario file or a stored scenario, checked and with every default filled in. A field nobody knows, or that the
 * engine cannot use yet, is refused by name. Parsing its own output gives the same scenario again.
 */
export function parseScenario(
  json: unknown,
  catalogue: Readonly<Record<string, ProfileRow>> = SHIPPED_ROWS,
): ParsedScenario {
  const parsed = scenarioSchema.safeParse(json)
  if (!parsed.success)
    return { ok: false, issues: parsed.error.issues.flatMap((issue) => spelled(issue, json)) }
  const issues = journeyIssues(parsed.data, catalogue)
  return issues.length > 0 ? { ok: false, issues } : { ok: true, scenario: parsed.data }
}

const DEPARTURE = 'Departure'

export const scenarioSchema = z
  .strictObject({
    schema: z.literal('steadfold/scenario@1', {
      error: (issue) => `Schema ${JSON.stringify(issue.input)}: put "steadfold/scenario@1".`,
    }),
    departure: instantText(DEPARTURE).optional().describe('Planned start of the first leg, ISO 8601, UTC.'),
    departureMs: instantMs(DEPARTURE)
      .optional()
      .describe('The same in milliseconds since 1970, as a stored scenario holds it.'),
    outputStepS: figureOr(
      { what: 'Spacing of the reported track', unit: 's', min: 30, max: 600 },
      60,
      'a point a minute',
    ),
    profiles: z
      .record(z.string(), profileRowSchema)
      .optional()
      .describe('The species rows in force. Absent: the shipped catalogue.'),
    limits: z
      .array(limitChangeSchema)
      .default([])
      .describe('Limits made tighter (air limits also wider), each with its reason.'),
    context: contextSchema
      .optional()
      .describe('What law, carriers and papers need. Absent: only physiology is evaluated.'),
    initial: z
      .array(initialStateSchema)
      .optional()
      .describe('A finalState of an earlier result, one per variant. Absent: loading.'),
    legs: z.array(legSchema).min(1, { error: 'Legs: put at least one.' }),
    crates: z.array(crateSchema).min(1, { error: 'Crates: put at least one.' }),
  })
  .transform(({ departure, departureMs, ...scenario }, context) => {
    const ms = eitherInstant(departure, departureMs)
    if (ms === undefined || (departure !== undefined && departureMs !== undefined)) {
      const message =
        ms === undefined
          ? 'Departure is missing: put an instant in UTC, for example 2026-06-09T08:20Z.'
          : 'Departure stands twice: keep departure or departureMs.'
      context.addIssue({ code: 'custom', path: ['departure'], message })
      return z.NEVER
    }
    return { ...scenario, departureMs: ms }
  })

/** Parts of the trade's world the engine does not compute yet; silence about them would be a wrong answer. */
const NOT_YET: Record<string, string> = {
  packs:
    'Ice, gel and heat packs cannot be simulated yet: take them out of the scenario, and out of the plan.',
  water: 'Animals in water cannot be simulated yet.',
  huddle: 'Huddling cannot be set yet: the species row decides.',
  ensemble: 'Ensembles cannot be run yet.',
  members: 'Ensembles cannot be run yet.',
  seed: 'Ensembles cannot be run yet.',
}

function spelled(issue: z.core.$ZodIssue, json: unknown): ScenarioIssue[] {
  if (issue.code === 'unrecognized_keys')
    return issue.keys.map((key) => {
      const path = [...issue.path, key]
      return {
        path: path.join('.'),
        message: NOT_YET[key] ?? `“${key}” is not a field here.`,
        received: at(json, path),
      }
    })
  const received = at(json, issue.path)
  return [{ path: issue.path.join('.'), message: issue.message, ...(received !== undefined && { received }) }]
}

function at(json: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (value, key) => (typeof value === 'object' && value !== null ? Reflect.get(value, key) : undefined),
    json,
  )
}

const _scenario: Same<z.output<typeof scenarioSchema>, Scenario> = true
