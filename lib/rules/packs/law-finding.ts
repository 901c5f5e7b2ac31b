import type { Finding } from '../result'
import type { Subject } from '../subject'
import { type LawView, type RuleSource, breachAs, citationAt } from './pack'

export type LawAnswer = Omit<
  Finding,
  'rule' | 'basis' | 'citation' | 'sourceTag' | 'overridable' | 'animalId' | 'crateId'
>

/**
 * One answer of the law for one animal. What rests on memory alone never breaks the law, and on a private journey, which
 * these laws mostly leave alone, nothing here is more than a note.
 */
export function lawAnswer(view: LawView, source: RuleSource, subject: Subject, answer: LawAnswer): Finding {
  const isPrivate = view.context.purpose === 'private' && answer.status !== 'met'
  const status = isPrivate ? 'note' : answer.status === 'breach' ? breachAs(source) : answer.status
  return {
    rule: source.rule,
    basis: 'law',
    animalId: subject.animal.id,
    crateId: subject.crate.id,
    ...answer,
    status,
    note: isPrivate ? `${answer.note} A private journey is mostly outside this law.` : answer.note,
    citation: citationAt(source, view.scenario.departureMs),
    sourceTag: source.tag,
    overridable: false,
  }
}
