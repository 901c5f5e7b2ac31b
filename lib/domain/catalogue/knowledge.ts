import 'server-only'
import { Op, literal } from 'sequelize'
import type { Transaction } from 'sequelize'
import type { PlanningKnowledge, ProfileInForce } from '@/lib/planning/reasons'
import type { Plan, PlanPlace } from '@/lib/schemas/plan'
import { isSteadfoldError } from '@/lib/errors'
import { profileValues } from '@/lib/species'
import type { Profile } from '@/lib/species'
import { models } from '@/models'
import type { Place } from '@/models'

/** All places, by name: a courier firm has hundreds, not thousands. */
export async function allPlaces(tx?: Transaction): Promise<PlanPlace[]> {
  const rows = await models.Place.findAll({ order: ['name'], transaction: tx ?? null })
  return rows.map(planPlace)
}

/** The species rows in force: the latest version of each key. */
export async function profilesInForce(tx?: Transaction): Promise<ProfileInForce[]> {
  const rows = await models.SpeciesProfile.findAll({
    where: {
      version: {
        [Op.eq]: literal(
          '(SELECT MAX(newer.version) FROM species_profiles AS newer WHERE newer.`key` = `SpeciesProfile`.`key`)',
        ),
      },
    },
    order: ['key'],
    transaction: tx ?? null,
  })
  return rows.map(({ key, commonName, version, profile }) => ({
    key,
    commonName,
    version,
    values: valuesOf(profile as unknown as Profile),
  }))
}

/**
 * A row is kept as lib/species writes it. One that lacks a core limit is still known, so that a plan can say why it cannot
 * be assessed by it.
 */
function valuesOf(profile: Profile): ProfileInForce['values'] {
  try {
    return profileValues(profile)
  } catch (error) {
    if (!isSteadfoldError(error)) throw error
    const { limits: _none, ...values } = profileValues({ ...profile, limits: ANY_LIMITS })
    return values
  }
}

const anyLimit = (value: number) => ({ value, unit: '°C', source: 'none', confidence: 'judgement' as const })
const ANY_LIMITS: Profile['limits'] = {
  criticalLowC: anyLimit(1),
  alarmLowC: anyLimit(2),
  alarmHighC: anyLimit(3),
  criticalHighC: anyLimit(4),
}

/** What judging a plan needs: the places it names and the species rows in force. */
export async function planningKnowledge(plan: Plan, tx?: Transaction): Promise<PlanningKnowledge> {
  const ids = plan.legs
    .flatMap(({ fromPlaceId, toPlaceId }) => [fromPlaceId, toPlaceId])
    .filter((id) => id !== null)
  const places = await models.Place.findAll({ where: { id: [...new Set(ids)] }, transaction: tx ?? null })
  return { places: places.map(planPlace), profiles: await profilesInForce(tx) }
}

function planPlace(row: Place): PlanPlace {
  return {
    id: row.id,
    name: row.name,
    kind: row.kind,
    country: row.country,
    zone: row.zone,
    latitudeDeg: row.latitude,
    longitudeDeg: row.longitude,
  }
}
