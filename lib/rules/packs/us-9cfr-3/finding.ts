import type { Finding } from '../../result'
import type { Subject } from '../../subject'
import { type LawAnswer, lawAnswer } from '../law-finding'
import type { LawView } from '../pack'
import { SOURCES, type SourceKey } from './sources'

/** One answer of these regulations, under the rule's own name and citation. */
export function lawFinding(view: LawView, source: SourceKey, subject: Subject, answer: LawAnswer): Finding {
  return lawAnswer(view, SOURCES[source], subject, answer)
}
