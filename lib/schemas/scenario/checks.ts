import type { CoreLimits, OpenAir, ProfileRow, Scenario, Surroundings } from '@/lib/thermal/scenario'

export interface ScenarioIssue {
  /** Dotted path into the document, e.g. "legs.2.surroundings.airTempC". */
  path: string
  message: string
  received?: unknown
}

/** Minutes of weather wanted past a leg's latest end: a leg may be lengthened by 240, a stop limit looks 60 further. */
const WEATHER_BEYOND_MIN = 300

/**
 * What no single field can tell: names that must agree, weather that must reach, limits that may not move outward.
 * `catalogue` holds the species rows in force where the scenario brings no row of its own.
 */
export function journeyIssues(
  scenario: Scenario,
  catalogue: Readonly<Record<string, ProfileRow>>,
): ScenarioIssue[] {
  const rows = { ...catalogue, ...scenario.profiles }
  return [
    ...nameIssues(scenario),
    ...referenceIssues(scenario),
    ...weatherIssues(scenario),
    ...profileIssues(scenario, rows),
    ...limitIssues(scenario, rows),
    ...initialIssues(scenario),
    ...unusedIssues(scenario),
  ]
}

function nameIssues({ legs, crates }: Scenario): ScenarioIssue[] {
  return [
    ...repeated(legs.map((leg, i) => ({ id: leg.id, path: `legs.${i}.id` }))),
    ...repeated(crates.map((crate, i) => ({ id: crate.id, path: `crates.${i}.id` }))),
    ...repeated(
      crates.flatMap((crate, i) =>
        crate.occupants.map(({ id }, j) => ({ id, path: `crates.${i}.occupants.${j}.id` })),
      ),
    ),
  ]
}

function repeated(entries: { id: string; path: string }[]): ScenarioIssue[] {
  const seen = new Set<string>()
  return entries.flatMap(({ id, path }) => {
    if (seen.has(id))
      return [{ path, message: `“${id}” stands twice: every id must be its own.`, received: id }]
    seen.add(id)
    return []
  })
}

function referenceIssues(scenario: Scenario): ScenarioIssue[] {
  const order = new Map(scenario.legs.map((leg, i) => [leg.id, i]))
  const named = (id: string | undefined, path: string): ScenarioIssue[] =>
    id === undefined || order.has(id)
      ? []
      : [{ path, message: `No leg “${id}” in this journey.`, received: id }]
  return scenario.crates.flatMap((crate, i) => {
    const path = `crates.${i}`
    const from = crate.fromLegId === undefined ? 0 : order.get(crate.fromLegId)
    const to = crate.toLegId === undefined ? scenario.legs.length - 1 : order.get(crate.toLegId)
    const backwards = from !== undefined && to !== undefined && from > to
    return [
      ...named(crate.fromLegId, `${path}.fromLegId`),
      ...named(crate.toLegId, `${path}.toLegId`),
      ...(backwards
        ? [{ path: `${path}.toLegId`, message: 'The crate leaves before it joins.', received: crate.toLegId }]
        : []),
      ...crate.byLeg.flatMap(({ legId }, j) => named(legId, `${path}.byLeg.${j}.legId`)),
      ...crate.occupants.flatMap((animal, j) =>
        Object.keys(animal.activityByLeg ?? {}).flatMap((legId) =>
          named(legId, `${path}.occupants.${j}.activityByLeg.${legId}`),
        ),
      ),
    ]
  })
}

function weatherIssues({ legs }: Scenario): ScenarioIssue[] {
  let startMin = 0
  let typicalEndMin = 0
  let worstExtraMin = 0
  return legs.flatMap((leg, i) => {
    const fromMin = startMin
    startMin += leg.durationMin
    typicalEndMin += leg.durationMin + leg.delay.typicalMin
    worstExtraMin = Math.max(worstExtraMin, leg.delay.worstMin - leg.delay.typicalMin)
    const toMin = typicalEndMin + worstExtraMin + WEATHER_BEYOND_MIN
    return openAirs(leg.surroundings, `legs.${i}.surroundings`).flatMap(({ air, path }) =>
      seriesIssues(air, path, fromMin, toMin),
    )
  })
}

function openAirs(surroundings: Surroundings, path: string): { air: OpenAir; path: string }[] {
  if (surroundings.type === 'open-air') return [{ air: surroundings, path }]
  return surroundings.outside === undefined ? [] : openAirs(surroundings.outside, `${path}.outside`)
}

function seriesIssues(air: OpenAir, path: string, fromMin: number, toMin: number): ScenarioIssue[] {
  const minutes = air.series.map((point) => point.minute)
  const [first, last] = [minutes[0], minutes.at(-1)]
  if (first === undefined || last === undefined || minutes.length === 1) return []
  const stumble = minutes.findIndex((minute, i) => i > 0 && minute <= (minutes[i - 1] ?? -Infinity))
  if (stumble > 0)
    return [
      {
        path: `${path}.series.${stumble}.minute`,
        message: 'Weather: each point must be later than the one before.',
        received: minutes[stumble],
      },
    ]
  const early =
    first > fromMin
      ? [
          {
            path: `${path}.series.0.minute`,
            message: `Weather starts at minute ${first}: the leg starts at minute ${fromMin}.`,
            received: first,
          },
        ]
      : []
  const late =
    last < toMin
      ? [
          {
            path: `${path}.series.${minutes.length - 1}.minute`,
            message: `Weather ends at minute ${last}: put points up to minute ${toMin} (the leg’s end at the worst delays plus ${WEATHER_BEYOND_MIN} minutes), or a single point.`,
            received: last,
          },
        ]
      : []
  return [...early, ...late]
}

function profileIssues(scenario: Scenario, rows: Readonly<Record<string, ProfileRow>>): ScenarioIssue[] {
  return scenario.crates.flatMap((crate, i) =>
    crate.occupants.flatMap((animal, j) => {
      const path = `crates.${i}.occupants.${j}`
      const row = rows[animal.profile]
      if (row === undefined)
        return [
          {
            path: `${path}.profile`,
            message: `No species profile “${animal.profile}”.`,
            received: animal.profile,
          },
        ]
      const { limits, massMinKg, massMaxKg } = row.values
      const noLimits =
        limits === undefined
          ? [
              {
                path: `${path}.profile`,
                message: `Species profile “${animal.profile}” has no alarm and critical limits: it cannot be assessed.`,
                received: animal.profile,
              },
            ]
          : []
      const mass =
        animal.massKg < massMinKg || animal.massKg > massMaxKg
          ? [
              {
                path: `${path}.massKg`,
                message: `Mass ${animal.massKg} kg: put ${massMinKg} to ${massMaxKg} kg for ${animal.profile}.`,
                received: animal.massKg,
              },
            ]
          : []
      return [...noLimits, ...mass]
    }),
  )
}

const CORE_LIMITS = [
  ['coreCriticalLowC', 'criticalLowC', 'low'],
  ['coreAlarmLowC', 'alarmLowC', 'low'],
  ['coreAlarmHighC', 'alarmHighC', 'high'],
  ['coreCriticalHighC', 'criticalHighC', 'high'],
] as const satisfies readonly (readonly [string, keyof CoreLimits, 'low' | 'high'])[]

function limitIssues(scenario: Scenario, rows: Readonly<Record<string, ProfileRow>>): ScenarioIssue[] {
  return scenario.limits.flatMap((change, i): ScenarioIssue[] => {
    const animals = scenario.crates.flatMap((crate) =>
      change.scope === 'profile' || change.scope === crate.id
        ? crate.occupants
        : crate.occupants.filter(({ id }) => id === change.scope),
    )
    if (animals.length === 0)
      return [
        {
          path: `limits.${i}.scope`,
          message: `Limit for “${change.scope}”: no crate or animal has this id.`,
          received: change.scope,
        },
      ]
    return CORE_LIMITS.flatMap(([field, limit, side]) => {
      const asked = change[field]
      if (asked === undefined) return []
      const outward = animals.filter(({ profile }) => {
        const own = rows[profile]?.values.limits?.[limit]
        return own !== undefined && (side === 'high' ? asked > own : asked < own)
      })
      return outward.slice(0, 1).map((animal) => ({
        path: `limits.${i}.${field}`,
        message: `Limit ${asked} °C lies outside the profile’s ${rows[animal.profile]?.values.limits?.[limit] ?? ''} °C for ${animal.id}: a body limit may be made tighter, never wider.`,
        received: asked,
      }))
    })
  })
}

function initialIssues(scenario: Scenario): ScenarioIssue[] {
  if (scenario.initial === undefined) return []
  const wanted = ['typical', 'heat-prone', 'cold-prone'] as const
  return wanted.flatMap((variant) => {
    const states = scenario.initial?.filter((state) => state.variant === variant) ?? []
    return states.length === 1
      ? []
      : [
          {
            path: 'initial',
            message: `Initial state: put exactly one for ${variant}.`,
            received: states.length,
          },
        ]
  })
}

/** Fields the engine holds a place for and cannot use yet, or not here: refused, since silence would look like an answer. */
function unusedIssues({ legs, crates }: Scenario): ScenarioIssue[] {
  const events = legs.flatMap((leg, i) =>
    leg.events.length > 0 && leg.surroundings.type !== 'enclosed'
      ? [
          {
            path: `legs.${i}.events`,
            message: 'Events: only an enclosed space has doors, fans and machines that can be off.',
            received: leg.events.length,
          },
        ]
      : [],
  )
  const meshes = crates.flatMap((crate, i) =>
    crate.openings.flatMap(({ meshMm }, j) =>
      meshMm === undefined
        ? []
        : [
            {
              path: `crates.${i}.openings.${j}.meshMm`,
              message: 'Mesh width cannot be used yet: give the free share of the mesh, meshOpenPct.',
              received: meshMm,
            },
          ],
    ),
  )
  const acclimated = crates.flatMap((crate, i) =>
    crate.occupants.flatMap(({ acclimatedToC }, j) =>
      acclimatedToC === undefined
        ? []
        : [
            {
              path: `crates.${i}.occupants.${j}.acclimatedToC`,
              message:
                'Acclimation cannot be computed yet: set the flag unacclimated, or attach an acclimation certificate.',
              received: acclimatedToC,
            },
          ],
    ),
  )
  return [...events, ...meshes, ...acclimated]
}
