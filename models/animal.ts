import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { animalSchema } from '@/lib/schemas/plan'
import type { PlanAnimal } from '@/lib/schemas/plan'
import { figure, json, key, link, oneOf, optional, smallCount, text, yesNo } from './columns'

/** An animal of the working plan, or several identical ones in one box. */
export class Animal extends Model<InferAttributes<Animal>, InferCreationAttributes<Animal>> {
  declare id: CreationOptional<number>
  declare consignmentId: number
  /** The id the plan knows it by, the same through all revisions. */
  declare ref: string
  declare position: number
  declare name: string
  declare profileKey: string
  declare breedNote: string
  declare identification: string
  declare sex: PlanAnimal['sex']
  declare ageDays: number | null
  declare massKg: number | null
  declare count: number
  declare temperament: PlanAnimal['temperament']
  declare crateTrained: boolean
  declare coatDepthMm: number | null
  declare coatClipped: boolean
  declare coatWetPct: number
  declare flags: PlanAnimal['flags']
  declare medicines: string
  /** 'yyyy-MM-dd' or empty. */
  declare examinedOn: string
  declare examinedBy: string
  /** Wall time 'yyyy-MM-ddTHH:mm' or empty. */
  declare lastFedLocal: string
  declare lastWateredLocal: string
}

export function initAnimal(sequelize: Sequelize): typeof Animal {
  return Animal.init(
    {
      id: key(),
      consignmentId: link(),
      ref: text(24),
      position: smallCount(),
      name: text(60),
      profileKey: text(40),
      breedNote: text(80),
      identification: text(80),
      sex: oneOf(['male', 'female', 'unknown']),
      ageDays: optional(figure()),
      massKg: optional(figure()),
      count: smallCount(),
      temperament: oneOf(['calm', 'anxious', 'unknown']),
      crateTrained: yesNo(),
      coatDepthMm: optional(figure()),
      coatClipped: yesNo(),
      coatWetPct: figure(),
      flags: json('flags', animalSchema.shape.flags),
      medicines: text(300),
      examinedOn: text(10),
      examinedBy: text(120),
      lastFedLocal: text(16),
      lastWateredLocal: text(16),
    },
    { sequelize, modelName: 'Animal', tableName: 'animals', timestamps: false },
  )
}
