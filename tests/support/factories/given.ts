import { createHash } from 'node:crypto'
import type { CreationAttributes, Model, ModelStatic } from 'sequelize'
import type { Models } from '@/models'

/** What a test says about a row; the factory fills in the rest. */
export type Given<Name extends keyof Models> = Partial<CreationAttributes<InstanceType<Models[Name]>>>

/** When things made by factories happened. */
export const AT = new Date('2026-06-09T08:00:00.000Z')

let counter = 0

/** Counts through a test file, for what must differ from row to row. */
export const next = () => (counter += 1)

/** The SHA-256 of a text or of bytes, for rows that need a hash. */
export const sha256 = (text: string | Buffer) => createHash('sha256').update(text).digest('hex')

/** The parent that was named, else a new one. */
export const orMake = async (id: number | null | undefined, parent: () => Promise<{ id: number }>) =>
  id ?? (await parent()).id

/** Stores a row and reads it back, so that it holds the database's nulls and defaults as any other row does. */
export async function stored<M extends Model>(
  model: ModelStatic<M>,
  values: CreationAttributes<M>,
): Promise<M> {
  return (await model.create(values)).reload()
}
