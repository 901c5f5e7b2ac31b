import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import { FLIGHT_PHASES, LEG_KINDS, legSchema, surroundingsSchema } from '@/lib/schemas/plan'
import type { PlanLeg, PlanSurroundings } from '@/lib/schemas/plan'
import type { Place } from './place'
import type { User } from './user'
import {
  figure,
  json,
  key,
  link,
  moment,
  oneOf,
  optional,
  smallCount,
  smallWhole,
  text,
  yesNo,
} from './columns'

/** A leg of the working plan. */
export class Leg extends Model<InferAttributes<Leg>, InferCreationAttributes<Leg>> {
  declare id: CreationOptional<number>
  declare consignmentId: number
  declare ref: string
  declare position: number
  declare kind: PlanLeg['kind']
  declare flightPhase: PlanLeg['flightPhase']
  declare fromPlaceId: number | null
  declare toPlaceId: number | null
  /** Wall time 'yyyy-MM-ddTHH:mm' at the from-place, or empty. */
  declare startLocal: string
  declare startZone: string | null
  /** Chosen where the clock shows that hour twice; minutes east of UTC. */
  declare startOffsetMin: number | null
  /** The instant the wall time means; null while it means none. */
  declare startsAt: Date | null
  declare endLocal: string
  declare endZone: string | null
  declare endOffsetMin: number | null
  declare endsAt: Date | null
  declare carrier: string
  declare serviceNumber: string
  declare surroundings: PlanSurroundings
  declare pressureKPa: number
  declare outOfCrate: boolean
  declare partyInCharge: string
  declare partyTelephone: string
  declare partyHours: string
  declare attended: boolean
  declare driverId: number | null
  declare delayTypicalMin: number
  declare delayWorstMin: number
  declare stops: PlanLeg['stops']
  declare lastPointOfReturn: string
  declare fallback: string
  declare note: string
  /** When and by whom its air was typed or last said to hold. */
  declare airEnteredAt: Date | null
  declare airEnteredBy: number | null

  declare fromPlace?: NonAttribute<Place | null>
  declare toPlace?: NonAttribute<Place | null>
  declare driver?: NonAttribute<User | null>
}

export function initLeg(sequelize: Sequelize): typeof Leg {
  return Leg.init(
    {
      id: key(),
      consignmentId: link(),
      ref: text(24),
      position: smallCount(),
      kind: oneOf(LEG_KINDS),
      flightPhase: optional(oneOf(FLIGHT_PHASES)),
      fromPlaceId: optional(link()),
      toPlaceId: optional(link()),
      startLocal: text(16),
      startZone: optional(text(40)),
      startOffsetMin: optional(smallWhole()),
      startsAt: optional(moment()),
      endLocal: text(16),
      endZone: optional(text(40)),
      endOffsetMin: optional(smallWhole()),
      endsAt: optional(moment()),
      carrier: text(80),
      serviceNumber: text(40),
      surroundings: json('surroundings', surroundingsSchema),
      pressureKPa: { ...figure(), field: 'pressure_kpa' },
      outOfCrate: yesNo(),
      partyInCharge: text(120),
      partyTelephone: text(40),
      partyHours: text(60),
      attended: yesNo(),
      driverId: optional(link()),
      delayTypicalMin: figure(),
      delayWorstMin: figure(),
      stops: json('stops', legSchema.shape.stops),
      lastPointOfReturn: text(120),
      fallback: text(160),
      note: text(500),
      airEnteredAt: optional(moment()),
      airEnteredBy: optional(link()),
    },
    { sequelize, modelName: 'Leg', tableName: 'legs', timestamps: false },
  )
}
