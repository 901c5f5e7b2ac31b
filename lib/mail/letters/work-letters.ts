import { dayTime } from '@/lib/views/format'
import type { Moment } from '@/lib/views/sheet'
import { type WrittenLetter, written } from './letter'

/*
 * Short letters that move work on: each says what happened, who did it, and the one page where it goes on.
 */

interface Work {
  mark: string
  revision: number
  /** "Peebles to Ravenna, 4 animals" */
  journey: string
  firm: string
  /** The page where it goes on; every one of them asks to sign in. */
  url: string
}

/** To every vet: a plan waits for review. */
export function submittedLetter(work: Work & { submittedBy: string; leaves: Moment | null }): WrittenLetter {
  const leaves = work.leaves && dayTime(work.leaves.ms, work.leaves.zone)
  return short(work, {
    subject: `${work.mark}, revision ${work.revision} waits for review${leaves ? `. Leaves ${leaves}` : ''}`,
    title: 'For review',
    text: `${work.submittedBy} sent revision ${work.revision} for review.${leaves ? ` It leaves ${leaves}.` : ''}`,
    said: '',
    link: 'Open the review',
  })
}

/** To the desk: a vet has sent the plan back. */
export function returnedLetter(
  work: Work & { returnedBy: string; crateMarks: string[]; reason: string },
): WrittenLetter {
  return short(work, {
    subject: `${work.mark}, revision ${work.revision} is returned: ${work.crateMarks.join(', ')}`,
    title: 'Returned',
    text: `${work.returnedBy} returned ${work.crateMarks.join(', ')}.`,
    said: work.reason,
    link: 'Open the plan',
  })
}

/** To the vet who signed and to the desk: an approval no longer holds. */
export function approvalVoidedLetter(
  work: Work & {
    crateMarks: string[]
    /** "Isla Quennell changed the plan" */
    because: string
    /** Why, in the words of whoever took it back; empty where nobody did. */
    reason: string
    voidedAt: Moment
  },
): WrittenLetter {
  const crates = work.crateMarks.join(', ')
  return short(work, {
    subject: `${work.mark}: approval of ${crates} no longer holds`,
    title: 'Approval void',
    text: `Since ${dayTime(work.voidedAt.ms, work.voidedAt.zone)} the approval of ${crates} no longer holds: ${work.because}. A paper that rests on it is void: don’t work from it.`,
    said: work.reason,
    link: 'Open the consignment',
  })
}

/** To the desk: the shipper asks for a change. */
export function changeAskedLetter(
  work: Work & { askedBy: string; about: string; text: string },
): WrittenLetter {
  return short(work, {
    subject: `${work.mark}: change asked for, ${work.about}`,
    title: 'Change asked for',
    text: `${work.askedBy} asks for a change of revision ${work.revision}: ${work.about}.`,
    said: work.text,
    link: 'Open the consignment',
  })
}

interface Short {
  subject: string
  title: string
  text: string
  /** What somebody wrote, word for word. */
  said: string
  link: string
}

function short(
  { mark, journey, firm, url }: Work,
  { subject, title, text, said, link }: Short,
): WrittenLetter {
  return written(subject, { mark, title, under: journey, firm, preview: text }, [
    { kind: 'paragraph', text },
    ...(said === '' ? [] : [{ kind: 'paragraph' as const, text: `“${said}”` }]),
    { kind: 'links', links: [{ label: link, url, first: true }] },
    { kind: 'note', text: 'It asks you to sign in.' },
  ])
}
