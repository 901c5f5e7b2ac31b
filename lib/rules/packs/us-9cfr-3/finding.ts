import type { Finding } from '../../result'
import type { Subject } from '../../subject'
import { type LawView, breachAs, citationAt } from '../pack'
import { SOURCES, type SourceKey } from './sources'

export type LawAnswer = Omit<
  Finding,
  'rule' | 'basis' | 'citation' | 'sourceTag' | 'overridable' | 'animalId' | 'crateId'
>

/**
 * One answer of the law for one animal. What rests on memory alone never breaks the law, and on a private journey, which
 * the Act mostly leaves alone, nothing here is more than a note.
 */
export function lawFinding(view: LawView, source: SourceKey, subject: Subject, answer: LawAnswer): Finding {
  const origin = SOURCES[source]
  const isPrivate = view.context.purpose === 'private' && answer.status !== 'met'
  const status = isPrivate ? 'note' : answer.status === 'breach' ? breachAs(origin) : answer.status
  return {
    rule: origin.rule,
    basis: 'law',
    animalId: subject.animal.id,
    crateId: subject.crate.id,
    ...answer,
    status,
    note: isPrivate ? `${answer.note} A private journey is mostly outside this law.` : answer.note,
    citation: citationAt(origin, view.scenario.departureMs),
    sourceTag: origin.tag,
    overridable: false,
  }
}
