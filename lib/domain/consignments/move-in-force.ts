import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import { timelineOf } from '@/lib/planning/timeline'
import type { Actor } from '@/lib/policies/actor'
import { nextState } from '@/lib/states/consignment'
import { models } from '@/models'
import type { Consignment } from '@/models'
import type { InForceState } from '@/models/consignment'
import { planningKnowledge } from '../catalogue/knowledge'
import { keepSnapshot } from '../snapshot'
import { boardFigures } from './board-figures'
import { writeEffectiveVerdict } from './effective-figures'
import { HOLDER_OF, wrongState } from './move'
import { planInForce } from './plan-in-force'
import { readPlan } from './read-plan'
import { writePlan } from './write-plan'
import { writeRow } from './write-row'

type RoadMove = 'depart' | 'deliver' | 'stop'

/**
 * Moves the revision in force along the written table. The road acts on that revision: a draft of a later one that was
 * being worked on is kept as a snapshot and set aside, and the consignment is again the one that travels. Says what was
 * set aside.
 */
export async function moveInForce(
  tx: Transaction,
  row: Consignment,
  verb: RoadMove,
  who: { actor: Actor; now: Date },
  also: { stoppedReason?: string } = {},
): Promise<{ state: InForceState; setAside: string | null }> {
  const from = row.inForceState
  if (from === null) throw new SteadfoldError('wrong_state', 'No revision of this consignment is released.')
  const to = nextState(from, verb)
  if (to === undefined || !isInForceState(to)) throw wrongState(from, verb)
  const setAside = row.revision === row.inForceRevision ? null : await setDraftAside(tx, row, who)
  const [count] = await models.Consignment.update(
    { ...also, state: to, inForceState: to, holder: HOLDER_OF[to] },
    { where: { id: row.id, inForceState: from, version: row.version }, transaction: tx },
  )
  if (count === 0)
    throw new SteadfoldError('wrong_state', 'Somebody else has just moved this consignment. Load it again.')
  await row.reload({ transaction: tx })
  return { state: to, setAside }
}

function isInForceState(state: string): state is InForceState {
  return state === 'released' || state === 'under_way' || state === 'delivered' || state === 'stopped'
}

async function setDraftAside(
  tx: Transaction,
  row: Consignment,
  { actor, now }: { actor: Actor; now: Date },
): Promise<string> {
  const released = await planInForce(row, tx)
  if (released === null)
    throw new SteadfoldError('wrong_state', 'No revision of this consignment is released.')
  const draft = { schema: 'steadfold/set-aside@1', revision: row.revision, plan: await readPlan(row, tx) }
  const kept = await keepSnapshot(tx, 'plan', draft)
  const { plan } = released
  const timeline = timelineOf(plan, released.places)
  await writePlan(tx, row.id, plan, timeline, { at: now, by: actor.id })
  await writeRow(tx, row, {
    ...boardFigures(plan, timeline, await planningKnowledge(plan, tx)),
    revision: released.revision,
    version: row.version + 1,
    planHash: released.planHash,
    assessmentId: released.assessmentId,
    outOfDate: false,
    shipperId: plan.shipperId,
    purpose: plan.purpose,
    parties: {
      consignor: plan.consignor,
      consignee: plan.consignee,
      emergencyContact: plan.emergencyContact,
    },
    handlingNote: plan.handlingNote,
  })
  await writeEffectiveVerdict(tx, row)
  return `The draft of revision ${draft.revision} was set aside (kept as ${kept.slice(0, 16)}).`
}
