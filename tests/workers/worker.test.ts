import { spawn, type ChildProcess } from 'node:child_process'
import { mkdtempSync } from 'node:fs'
import { rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'
import * as esbuild from 'esbuild'
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { planInForce } from '@/lib/domain/consignments/plan-in-force'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { claim, LEASE_MS } from '@/lib/domain/jobs/queue'
import { releaseConsignment } from '@/lib/domain/release/release'
import { checkSeal, readDocumentCode } from '@/lib/documents/verify'
import { deliverNext } from '@/lib/mail/outbox'
import { smtpTransport } from '@/lib/mail/transport'
import { signingIdentity } from '@/lib/signing'
import { plainAssessor } from '@/lib/workers/assessor'
import { runNextJob } from '@/lib/workers/run-job'
import { models } from '@/models'
import { act, approved, later, NOW, saved, world, type World } from '../domain/world'
import { pdfsig, textOf } from '../documents/support/pdf-tools'
import { mailServer } from '../mail/support/mail-server'
import { emptyTables } from '../support/db'

const root = process.cwd()
const bundle = path.join(root, 'dist', `test-worker-${process.pid}`)
const LONG = 180_000

// A key of its own: nothing here may touch the installation's. Read at the first call of env(), which comes later.
process.env.DATA_DIR = mkdtempSync(path.join(tmpdir(), 'steadfold-worker-'))
afterAll(() => rm(process.env.DATA_DIR ?? bundle, { recursive: true, force: true }))

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
}, LONG)

const shift = (worker = 'worker-1', clock = () => NOW) => ({ worker, clock, assessor: plainAssessor() })

async function asked(): Promise<{ consignmentId: number; assessmentId: number }> {
  const { consignmentId } = await saved(place, NOW)
  const { assessmentId } = await assessConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
  return { consignmentId, assessmentId }
}

describe('an assessment in the queue', () => {
  it(
    'is run by the engine itself, recorded with findings and tracks, and leaves nothing to do',
    async () => {
      const { consignmentId, assessmentId } = await asked()
      expect(await runNextJob(shift())).toBe(true)
      expect(await models.Assessment.findByPk(assessmentId)).toMatchObject({ status: 'done', error: null })
      expect(await models.Finding.count({ where: { assessmentId } })).toBeGreaterThan(10)
      expect(await models.AssessmentTrack.count({ where: { assessmentId } })).toBe(1)
      expect((await models.Consignment.findByPk(consignmentId))?.state).toBe('assessed')
      expect((await models.Job.findAll()).map(({ state }) => state)).toEqual(['done'])
      expect(await runNextJob(shift())).toBe(false)
    },
    LONG,
  )

  it(
    'is taken over by another worker once the first has been silent for its lease, and recorded once',
    async () => {
      const { assessmentId } = await asked()
      await claim('worker-that-dies', ['assess'], NOW)
      expect(await runNextJob(shift('worker-2', () => NOW))).toBe(false)
      const afterLease = () => new Date(NOW.getTime() + LEASE_MS + 1)
      expect(await runNextJob(shift('worker-2', afterLease))).toBe(true)
      expect((await models.Assessment.findByPk(assessmentId))?.status).toBe('done')
      expect(await models.AssessmentTrack.count({ where: { assessmentId } })).toBe(1)
    },
    LONG,
  )
})

describe('an assessment the engine cannot follow', () => {
  it(
    'is an error with its leg and minute, in words, and never a verdict',
    async () => {
      const { consignmentId } = await saved(place, NOW)
      await bandsWithoutWidth()
      const ask = { ...act(), consignmentId }
      const { assessmentId } = await assessConsignment(place.as('dispatcher'), ask, NOW)
      expect(await runNextJob(shift())).toBe(true)
      expect(await models.Assessment.findByPk(assessmentId)).toMatchObject({
        status: 'failed',
        verdict: null,
        error: {
          code: 'not_converged',
          legId: 'leg-1',
          minute: 0,
          message: 'The simulation does not converge on leg 1 (road) at minute 0.',
        },
      })
      const row = await models.Consignment.findByPk(consignmentId)
      expect(row).toMatchObject({ state: 'draft', verdict: null })
    },
    LONG,
  )
})

/** A dog's row whose controller is all or nothing at its set-point: a step no solver can follow. */
async function bandsWithoutWidth() {
  const old = await models.SpeciesProfile.findOne({ where: { key: 'dog' }, rejectOnEmpty: true })
  const { id: _id, profile, ...row } = old.get({ plain: true })
  const none: [number, number] = [0, 0]
  const bands = { ...profile.bands, value: { vasomotor: none, cold: none, pant: none, wet: none } }
  const createdBy = place.people.admin.id
  await models.SpeciesProfile.create({
    ...row,
    profile: { ...profile, bands },
    version: row.version + 1,
    createdBy,
  })
}

describe('a release in the queue', () => {
  it(
    'makes sealed papers, queues the mail, and the shipper gets the manifest to the byte',
    async () => {
      await keyOfThatDay()
      const { consignmentId } = await approved(place, NOW)
      await releaseConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
      while (await runNextJob(shift('worker-1', () => later(1)))) continue
      const job = await models.Job.findOne({ where: { kind: 'release' } })
      expect(job).toMatchObject({ state: 'done', lastError: null })

      const papers = await models.Document.unscoped().findAll({ where: { consignmentId }, order: ['id'] })
      expect(papers.map(({ kind, state }) => `${kind} ${state}`)).toEqual([
        'go_no_go current',
        'manifest current',
      ])
      const { rootPem } = await signingIdentity()
      for (const { bytes, code } of papers) {
        const said = await pdfsig(bytes, rootPem)
        expect(said).toContain('Signature is Valid.')
        expect(said).toContain('Certificate is Trusted.')
        expect(said).toContain('Total document signed')
        expect(checkSeal(bytes)).toMatchObject({
          coversAll: true,
          digestMatches: true,
          signatureMatches: true,
        })
        expect(readDocumentCode(bytes)).toBe(code)
      }
      const manifest = papers[1]
      const text = (await textOf(manifest?.bytes ?? Buffer.alloc(0))).replace(/\s+/g, ' ')
      for (const { name, identification } of place.plan.animals) {
        expect(text).toContain(name)
        expect(text).toContain(identification)
      }
      const sheet = (await textOf(papers[0]?.bytes ?? Buffer.alloc(0))).replace(/\s+/g, ' ')
      expect(sheet).not.toContain('nothing is released')

      const server = await mailServer()
      const delivery = {
        transport: smtpTransport(server.url),
        from: 'Corran Animal Couriers <desk@corran.example>',
        worker: 'worker-1',
        clock: () => later(2),
      }
      while ((await deliverNext(delivery)) === 'sent') continue
      await server.close()
      const papersMailed = server.taken.filter(({ attachments }) => attachments.length > 0)
      expect(papersMailed).toHaveLength(1)
      const [mail] = papersMailed
      expect(mail?.attachments).toHaveLength(1)
      expect(mail?.attachments[0]?.content.equals(manifest?.bytes ?? Buffer.alloc(0))).toBe(true)
      expect(mail?.subject).toContain('revision 1')
    },
    LONG,
  )
})

describe('a telephone saved while the papers are made', () => {
  it(
    'is on the papers that are recorded, and in the plan kept with them',
    async () => {
      await keyOfThatDay()
      const { consignmentId, version } = await approved(place, NOW)
      await releaseConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
      const plan = structuredClone(place.plan)
      plan.emergencyContact.telephone = '+44 7700 900999'
      await models.Job.destroy({ where: { kind: 'assess' } })
      let asked = 0
      let saving: Promise<unknown> | undefined
      const clock = () => {
        asked += 1
        // First to take the job, then to prepare; from the third time on the papers are being drawn.
        if (asked === 3) {
          const save = { ...act(), consignmentId, version, plan }
          saving = saveConsignment(place.as('dispatcher'), save, later(1))
        }
        return later(1)
      }
      expect(await runNextJob(shift('worker-1', clock))).toBe(true)
      await saving
      // Once to take the job, three times for papers that were thrown away, three times for those that stand.
      expect(asked).toBeGreaterThanOrEqual(7)
      expect(await models.Job.findOne({ where: { kind: 'release' } })).toMatchObject({
        state: 'done',
        lastError: null,
      })
      const papers = await models.Document.unscoped().findAll({ where: { consignmentId } })
      expect(papers.map(({ kind }) => kind).sort()).toEqual(['go_no_go', 'manifest'])
      const manifest = papers.find(({ kind }) => kind === 'manifest')
      expect(await textOf(manifest?.bytes ?? Buffer.alloc(0))).toContain('+44 7700 900999')
      const row = await models.Consignment.findByPk(consignmentId, { rejectOnEmpty: true })
      expect((await planInForce(row))?.plan.emergencyContact.telephone).toBe('+44 7700 900999')
    },
    LONG,
  )
})

describe('the worker as a process', () => {
  beforeAll(() => bundleWorker(), LONG)
  afterAll(() => rm(bundle, { recursive: true, force: true }))

  it(
    'killed in the middle of a run loses nothing: the next one finishes it, and ends when asked',
    async () => {
      const { assessmentId } = await asked()
      const first = start()
      await until(async () => (await models.Assessment.findByPk(assessmentId))?.status === 'running')
      await ended(first, 'SIGKILL')
      expect(await models.Job.findOne()).toMatchObject({ state: 'running' })
      expect((await models.Assessment.findByPk(assessmentId))?.status).toBe('running')

      // What a minute of silence does, without the minute.
      await models.Job.update({ leaseUntil: new Date(Date.now() - 1) }, { where: {} })
      const second = start()
      await until(async () => (await models.Assessment.findByPk(assessmentId))?.status === 'done')
      expect(await ended(second, 'SIGTERM')).toBe(0)
      expect(await models.Job.findOne()).toMatchObject({ state: 'done', attempts: 2 })
      expect(await models.AssessmentTrack.count({ where: { assessmentId } })).toBe(1)
    },
    LONG,
  )

  it(
    'asked to end in the middle of a run gives the job back for the next one',
    async () => {
      await asked()
      const child = start()
      await until(async () => (await models.Job.findOne())?.state === 'running')
      expect(await ended(child, 'SIGTERM')).toBe(0)
      // Ended in time or given back: never left to a lease.
      expect(['queued', 'done']).toContain((await models.Job.findOne())?.state)
      expect((await models.Job.findOne())?.leasedBy).toBeNull()
    },
    LONG,
  )
})

/** The world of these tests lives in June: the key has to begin before its papers. */
async function keyOfThatDay(): Promise<void> {
  vi.useFakeTimers({ toFake: ['Date'], now: NOW })
  try {
    await signingIdentity()
  } finally {
    vi.useRealTimers()
  }
}

async function bundleWorker(): Promise<void> {
  await esbuild.build({
    absWorkingDir: root,
    entryPoints: ['lib/workers/worker.ts', 'lib/workers/assess-thread.ts'],
    outdir: bundle,
    outExtension: { '.js': '.mjs' },
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    packages: 'external',
    jsx: 'automatic',
    logLevel: 'silent',
    alias: { 'server-only': path.join(root, 'tests/support/server-only.ts') },
  })
}

function start(): ChildProcess {
  return spawn(process.execPath, [path.join(bundle, 'worker.mjs')], {
    cwd: root,
    env: { ...process.env, TZ: 'UTC' },
    stdio: ['ignore', 'ignore', 'inherit'],
  })
}

function ended(child: ChildProcess, signal: 'SIGKILL' | 'SIGTERM'): Promise<number | null> {
  return new Promise((resolve) => {
    child.once('exit', (code) => resolve(code))
    child.kill(signal)
  })
}

async function until(holds: () => Promise<boolean>): Promise<void> {
  while (!(await holds())) await wait(100)
}
