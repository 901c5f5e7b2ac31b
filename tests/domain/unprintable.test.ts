import { beforeEach, describe, expect, it } from 'vitest'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { prepareRelease } from '@/lib/domain/release/prepare'
import { releaseConsignment } from '@/lib/domain/release/release'
import { paperReasons } from '@/lib/planning/reasons/paper'
import { timelineOf } from '@/lib/planning/timeline'
import { planSchema } from '@/lib/schemas/plan'
import type { Plan } from '@/lib/schemas/plan'
import { buildManifestView } from '@/lib/views/manifest-view/build-manifest-view'
import { buildSheetView } from '@/lib/views/sheet-view/build-sheet-view'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import { NOW, act, approved, inReview, refusal, saved, signature, world } from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

describe('a name the paper cannot show', () => {
  it('is refused at its field when the plan is assessed, long before a vet signs', async () => {
    place.plan.animals.forEach((animal, index) => (animal.name = index === 0 ? 'Γαία' : animal.name))
    const { consignmentId } = await saved(place, NOW)
    const error = await refusal(assessConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW))
    expect(error).toMatchObject({
      code: 'invalid',
      issues: [{ path: 'animals.0.name', message: expect.stringContaining('“Γαία” holds “Γ”') as string }],
    })
    expect(await models.Job.count()).toBe(0)
  })

  it('saved after the vet signed takes the signature back instead of stopping the release', async () => {
    const { consignmentId, version } = await approved(place, NOW)
    const plan = structuredClone(place.plan)
    plan.consignee.name = '犬の家'
    const save = { ...act(), consignmentId, version, plan }
    expect(await saveConsignment(place.as('dispatcher'), save, NOW)).toMatchObject({ state: 'draft' })
    const release = releaseConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
    expect(await refusal(release)).toMatchObject({ code: 'wrong_state' })
  })

  it('signs nothing where it is the vet’s own', async () => {
    const { consignmentId } = await inReview(place, NOW)
    await models.User.update({ name: 'Д. Aird' }, { where: { id: place.people.vet.id } })
    const error = await refusal(approveCrates(place.as('vet'), await signature(place, consignmentId), NOW))
    expect(error.code).toBe('refused')
    expect(error.message).toContain('“Д. Aird” holds “Д”')
    expect(await models.Approval.count()).toBe(0)
  })
})

it('every text of the plan that stands on a paper is looked at, and none that does not', async () => {
  const { consignmentId } = await approved(place, NOW)
  await releaseConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
  const job = await models.Job.findOne({ where: { kind: 'release' }, rejectOnEmpty: true })
  const prepared = await prepareRelease(job.payload, NOW)
  if (prepared === null) throw new Error('It is not released yet.')

  const { plan, paths } = marked(place.plan)
  const facts = { ...prepared.manifest, plan }
  const papers = JSON.stringify([
    buildSheetView(facts),
    buildManifestView({
      ...facts,
      documentCode: facts.documentCode ?? '',
      verifyUrl: '',
      releasedBy: '',
      releasedAtMs: NOW.getTime(),
      shipperEmail: '',
      vetOnCall: null,
      crateModels: [],
      seal: { subject: '', serial: '', validToMs: 0, selfIssued: true },
    }),
  ])
  const printed = paths.filter((_, index) => papers.includes(mark(index)))
  expect(printed.length).toBeGreaterThan(20)

  const said = paperReasons(plan, timelineOf(plan, prepared.manifest.places))
  expect(said.map(({ path }) => path).sort()).toEqual([...printed].sort())
})

const mark = (index: number) => `Ж${String(index).padStart(3, '0')}Ж`

/** The plan with each text a person types freely put in words of its own, and where each stands. */
function marked(original: Plan): { plan: Plan; paths: string[] } {
  const plan = structuredClone(original)
  const paths: string[] = []
  const visit = (part: unknown, path: string) => {
    if (typeof part !== 'object' || part === null) return
    for (const [key, value] of Object.entries(part)) {
      const here = path === '' ? key : `${path}.${key}`
      if (typeof value !== 'string') {
        visit(value, here)
        continue
      }
      const put = (words: string) => ((part as Record<string, unknown>)[key] = words)
      put(mark(paths.length))
      if (planSchema.safeParse(plan).success && key !== 'profileKey') paths.push(here)
      else put(value)
    }
  }
  visit(plan, '')
  return { plan, paths }
}
