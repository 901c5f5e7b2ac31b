import 'server-only'
import { env } from '@/lib/env'
import { demoWorld } from './demo/world'
import { DEMO_CONSIGNMENTS } from './demo/consignments'
import { DEMO_PASSWORD, DEMO_PEOPLE } from './demo/people'
import { bringTo } from './demo/stages'

export interface DemoSignIns {
  password: string
  people: { role: string; name: string; email: string }[]
}

/**
 * An invented courier with its people and consignments, dates relative to today. Every step is taken through the same
 * verbs that people use, with a request id made from what is asked, so that seeding again changes nothing.
 */
export async function seed(): Promise<DemoSignIns> {
  if (!env().demo) return { password: '', people: [] }
  const world = await demoWorld(new Date())
  for (const consignment of DEMO_CONSIGNMENTS) await bringTo(consignment, world)
  return {
    password: DEMO_PASSWORD,
    people: DEMO_PEOPLE.map(({ role, name, email }) => ({ role, name, email })),
  }
}
