import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import type { z } from 'zod'
import type { Verdict } from '@/lib/rules/result'
import { HOLDERS } from '@/lib/schemas/board'
import type { Holder } from '@/lib/schemas/board'
import { PURPOSES, planSchema } from '@/lib/schemas/plan'
import { CONSIGNMENT_STATES } from '@/lib/states/consignment'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { Animal } from './animal'
import type { Crate } from './crate'
import type { Leg } from './leg'
import type { Shipper } from './shipper'
import {
  count,
  decimal,
  hash,
  json,
  key,
  link,
  moment,
  oneOf,
  optional,
  text,
  whole,
  withDefault,
  yesNo,
} from './columns'

export const IN_FORCE_STATES = ['released', 'under_way', 'delivered', 'stopped'] as const
export type InForceState = (typeof IN_FORCE_STATES)[number]

export const VERDICTS: readonly Verdict[] = ['go', 'conditional', 'no-go']

export const partiesSchema = planSchema.pick({ consignor: true, consignee: true, emergencyContact: true })
export type Parties = z.infer<typeof partiesSchema>

/** A consignment: its states, its plan in force and its working plan (animals, crates and legs are rows of their own). */
export class Consignment extends Model<InferAttributes<Consignment>, InferCreationAttributes<Consignment>> {
  declare id: CreationOptional<number>
  /** Four digits, unique among open consignments. */
  declare mark: string
  declare shipperId: number
  /** The working revision's state. */
  declare state: CreationOptional<ConsignmentState>
  declare revision: CreationOptional<number>
  /** Raised by each save of the plan and by nothing else: Sequelize's own counter would also count the board's figures. */
  declare version: CreationOptional<number>
  declare inForceRevision: number | null
  declare inForceState: InForceState | null
  declare inForceSnapshotHash: string | null
  /** Computed by the database: the mark while open, null once closed. Never write it. */
  declare openMark: CreationOptional<string | null>
  declare purpose: (typeof PURPOSES)[number]
  declare parties: Parties
  declare handlingNote: CreationOptional<string>
  declare planHash: string | null
  /** The latest assessment of the working revision. */
  declare assessmentId: number | null
  /** From here to holder: kept for the board, written with the plan and the assessment. */
  declare departsAt: Date | null
  declare departsZone: string | null
  declare arrivesAt: Date | null
  declare arrivesZone: string | null
  declare fromPlaceName: string | null
  declare toPlaceName: string | null
  declare animalsSummary: CreationOptional<string>
  declare verdict: Verdict | null
  declare deciding: string | null
  declare marginMin: number | null
  declare marginOutsideAirC: number | null
  /** Computed by the database for the board's order: the margin, or past any there is. Never write them. */
  declare marginRising: CreationOptional<number | null>
  declare marginFalling: CreationOptional<number | null>
  declare marginBodyC: number | null
  declare outOfDate: CreationOptional<boolean>
  /** Whose move it is. */
  declare holder: CreationOptional<Holder>
  declare stoppedReason: string | null
  declare createdBy: number
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>

  declare shipper?: NonAttribute<Shipper>
  declare animals?: NonAttribute<Animal[]>
  declare crates?: NonAttribute<Crate[]>
  declare legs?: NonAttribute<Leg[]>
}

export function initConsignment(sequelize: Sequelize): typeof Consignment {
  return Consignment.init(
    {
      id: key(),
      mark: text(4),
      shipperId: link(),
      state: withDefault(oneOf(CONSIGNMENT_STATES), 'draft'),
      revision: withDefault(count(), 1),
      version: withDefault(count(), 0),
      inForceRevision: optional(count()),
      inForceState: optional(oneOf(IN_FORCE_STATES)),
      inForceSnapshotHash: optional(hash()),
      openMark: optional(text(4)),
      purpose: oneOf(PURPOSES),
      parties: json('parties', partiesSchema),
      handlingNote: withDefault(text(1000), ''),
      planHash: optional(hash()),
      assessmentId: optional(link()),
      departsAt: optional(moment()),
      departsZone: optional(text(40)),
      arrivesAt: optional(moment()),
      arrivesZone: optional(text(40)),
      fromPlaceName: optional(text(120)),
      toPlaceName: optional(text(120)),
      animalsSummary: withDefault(text(200), ''),
      verdict: optional(oneOf(VERDICTS)),
      deciding: optional(text(300)),
      marginMin: optional(whole()),
      marginOutsideAirC: optional(decimal('marginOutsideAirC', 5, 1)),
      marginRising: optional(decimal('marginRising', 6, 1)),
      marginFalling: optional(decimal('marginFalling', 6, 1)),
      marginBodyC: optional(decimal('marginBodyC', 6, 3)),
      outOfDate: withDefault(yesNo(), false),
      holder: withDefault(oneOf(HOLDERS), 'dispatcher'),
      stoppedReason: optional(text(500)),
      createdBy: link(),
      createdAt: moment(),
      updatedAt: moment(),
    },
    { sequelize, modelName: 'Consignment', tableName: 'consignments' },
  )
}
