import { QueryTypes } from 'sequelize'
import { database } from '@/lib/db/connection'

export const dynamic = 'force-dynamic'

/** Whether the server answers and reaches its database; nothing else is told to a stranger. */
export async function GET(): Promise<Response> {
  const up = await reachesDatabase()
  return Response.json(
    { status: up ? 'ok' : 'unavailable' },
    { status: up ? 200 : 503, headers: { 'cache-control': 'no-store' } },
  )
}

async function reachesDatabase(): Promise<boolean> {
  try {
    await database().query('SELECT 1', { type: QueryTypes.SELECT })
    return true
  } catch {
    return false
  }
}
