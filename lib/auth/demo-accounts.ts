import 'server-only'
import { readFile } from 'node:fs/promises'
import path from 'node:path'
import { z } from 'zod'
import { env } from '@/lib/env'

const noteSchema = z.object({
  demo: z.object({
    password: z.string(),
    people: z.array(z.object({ role: z.string(), name: z.string(), email: z.string() })),
  }),
})

export type DemoAccounts = z.infer<typeof noteSchema>['demo']

/**
 * The invented people one may sign in as, on an installation whose start command filled in the demo and noted it beside
 * the database. Null anywhere else: an installation with people of its own never shows a password.
 */
export async function demoAccounts(): Promise<DemoAccounts | null> {
  const { dataDir, database } = env()
  const note = path.join(/* turbopackIgnore: true */ dataDir, `seeded-${database.name}.json`)
  try {
    const parsed = noteSchema.safeParse(JSON.parse(await readFile(/* turbopackIgnore: true */ note, 'utf8')))
    return parsed.success ? parsed.data.demo : null
  } catch {
    return null
  }
}
