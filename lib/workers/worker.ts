import 'server-only'
import { randomUUID } from 'node:crypto'
import { availableParallelism } from 'node:os'
import { closeDatabase } from '@/lib/db/connection'
import { env } from '@/lib/env'
import { deliverNext, giveUpOnSilent } from '@/lib/mail/outbox'
import { smtpTransport } from '@/lib/mail/transport'
import { threadedAssessor } from './assessor'
import { workLoop } from './loop'
import { runNextJob } from './run-job'

/*
 * The one process beside the web server: assesses, releases, delivers. What it does is always a row first, so killing it
 * at any moment loses nothing; whoever starts it next goes on once the leases have run out.
 */

const worker = `worker-${randomUUID().slice(0, 8)}`
const clock = () => new Date()
const stopping = new AbortController()
for (const signal of ['SIGTERM', 'SIGINT'] as const) process.once(signal, () => stopping.abort())

const { smtpUrl, mailFrom } = env()
const transport = smtpUrl === undefined ? null : smtpTransport(smtpUrl)
const assessor = threadedAssessor({ threads: Math.max(1, availableParallelism() - 1) })

const loops = [
  workLoop('jobs', stopping.signal, () => runNextJob({ worker, assessor, clock, signal: stopping.signal })),
  workLoop('mail', stopping.signal, async () => {
    if (transport === null) return false
    await giveUpOnSilent(clock())
    return (await deliverNext({ transport, from: mailFrom, worker, clock })) !== null
  }),
]
await Promise.all(loops)
await assessor.close()
await closeDatabase()
