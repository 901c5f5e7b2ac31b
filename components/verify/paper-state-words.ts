import { clock, dayDateYear, zoneWithOffset } from '@/lib/views/format'
import type { Moment } from '@/lib/views/sheet'
import type { VerificationView } from '@/lib/views/verification'

export interface PaperStateWords {
  /** What is so. */
  fact: string
  /** What to do about it. */
  act: string
}

/** The sentences under the drawn sheet. */
export function paperStateWords({ state, by, paper }: VerificationView): PaperStateWords {
  const when = paper?.stateChanged ? ` ${fullTime(paper.stateChanged)}` : ''
  switch (state) {
    case 'current':
      return { fact: 'We issued this paper and nothing has replaced it.', act: 'It is the paper in force.' }
    case 'superseded':
      return paper && paper.latestRevision > paper.revision
        ? {
            fact: `We issued it as revision ${paper.revision}. Revision ${paper.latestRevision} took its place${when}.`,
            act: `Ask for revision ${paper.latestRevision} before you move a crate.`,
          }
        : {
            fact: `We issued it, and a newer paper took its place${when}.`,
            act: 'Ask for the newer paper before you move a crate.',
          }
    case 'void':
      return {
        fact: `We issued it and took it back${when}. Nothing has taken its place.`,
        act: 'Don’t work from it. Ring the desk.',
      }
    case 'not-as-issued':
      return {
        fact: 'It carries a code of ours, but not the bytes we issued: it was changed, or saved again by another program.',
        act: 'Don’t work from it. Keep it, and ring the desk.',
      }
    case 'unknown':
      return by === 'code'
        ? {
            fact: 'No paper of ours has this code. It may be mistyped, altered, or another firm’s.',
            act: 'Type it again; then ring the desk.',
          }
        : {
            fact: 'No paper of ours has these bytes, and it carries no code of ours. It may be another firm’s.',
            act: 'Type the code printed on it; then ring the desk.',
          }
  }
}

/** "Thu 11 Jun 2026, 09:12 BST (UTC+1)" */
export function fullTime({ ms, zone }: Moment): string {
  return `${dayDateYear(ms, zone)}, ${clock(ms, zone)}\u00a0${zoneWithOffset(ms, zone)}`
}
