import { printedCode } from '@/lib/documents/code'
import {
  airMargin,
  dayDate,
  dayDateYear,
  duration,
  figure,
  localTime,
  localTimeWithOffset,
  minutesToSpare,
} from '@/lib/views/format'
import type { ManifestView } from '@/lib/views/manifest'
import type { Moment } from '@/lib/views/sheet'
import { type WrittenLetter, written } from './letter'
import type { LetterCell, LetterPart } from './parts'
import { stampWords } from './text'

/** The manifest's mail to the shipper: what is asked and by when, then what the paper says, in the paper's order. */
export function manifestLetter(view: ManifestView, { appUrl }: { appUrl: string }): WrittenLetter {
  const { mark, revision, leaves, firm } = view
  const by = localTime(leaves.ms, leaves.zone)
  const subject = `${mark}, revision ${revision}: ${stampWords(view.stamp)}. To acknowledge by ${by}`
  const head = {
    mark,
    title: `Manifest, revision ${revision}`,
    under: `${counted(view.animalCount, 'animal')} in ${counted(view.crateCount, 'crate')}`,
    firm: [firm.name, firm.town].filter(Boolean).join(', '),
    preview: `Leaves ${at(leaves)}. Acknowledge before it leaves.`,
  }
  const page = `${appUrl}/portal/${view.consignmentId}`
  return written(subject, head, [
    { kind: 'stamp', stamp: view.stamp },
    { kind: 'paragraph', bold: view.headline, text: view.headlineMore.join(' ') },
    ...overrides(view),
    {
      kind: 'links',
      links: [
        { label: `Acknowledge revision ${revision}`, url: page, first: true },
        { label: 'Ask for a change', url: `${page}#change`, first: false },
      ],
    },
    { kind: 'note', text: `By ${at(leaves)}, when it leaves. Both ask you to sign in.` },
    ...journey(view),
    ...conditions(view),
    ...animals(view),
    ...legs(view),
    ...approvals(view),
    { kind: 'heading', text: 'Ring' },
    {
      kind: 'facts',
      rows: [
        { label: 'Desk', lines: [`${firm.deskTelephone}, ${firm.deskHours}`] },
        { label: 'Reply', lines: ['An answer to this mail goes to the desk.'] },
      ],
    },
    ...paper(view, appUrl),
  ])
}

function counted(count: number, one: string): string {
  return `${count} ${one}${count === 1 ? '' : 's'}`
}

function at({ ms, zone }: Moment): string {
  return `${dayDateYear(ms, zone)}, ${localTimeWithOffset(ms, zone)}`
}

function overrides({ overrides: all }: ManifestView): LetterPart[] {
  return all.map(({ findingWords, vetName, signedAt, reason }) => ({
    kind: 'paragraph',
    bold: `Overridden: ${findingWords}.`,
    text: `${vetName}, ${dayDate(signedAt.ms, signedAt.zone)} ${localTime(signedAt.ms, signedAt.zone)}: ${reason}`,
  }))
}

function journey(view: ManifestView): LetterPart[] {
  const { leaves, arrives, revision, replacesRevision } = view
  const first = view.legs[0]?.fromPlace ?? ''
  const last = view.legs.at(-1)?.toPlace ?? ''
  return [
    { kind: 'heading', text: 'The journey' },
    {
      kind: 'facts',
      rows: [
        { label: 'Leaves', lines: [partyAt(view.consignor.name, first), at(leaves)] },
        { label: 'Arrives', lines: [partyAt(view.consignee.name, last), at(arrives)] },
        { label: 'In crate', lines: [`${duration(view.journeyMin)}, ${counted(view.legs.length, 'leg')}`] },
        ...(replacesRevision === null
          ? []
          : [
              {
                label: `New in ${revision}`,
                lines: [`It replaces revision ${replacesRevision}: throw that one away.`],
              },
            ]),
      ],
    },
  ]
}

/** "Hallmyre Kennels, Peebles"; a place called after its party is said once. */
function partyAt(party: string, place: string): string {
  if (place.includes(party)) return place
  return [party, party.includes(place) ? '' : place].filter(Boolean).join(', ')
}

function conditions({ conditions: all }: ManifestView): LetterPart[] {
  if (all.length === 0) return []
  return [
    { kind: 'heading', text: 'Conditions' },
    {
      kind: 'numbered',
      rows: all.map(({ number, text, legWords, askedOf, answerWords }) => ({
        number,
        text: `${text.replace(/\.$/, '')}, ${legWords === 'all' ? 'whole journey' : `leg ${legWords}`}`,
        under: `${askedOf}: ${answerWords}`,
      })),
    },
  ]
}

function animals({ animals: all, crates, mark }: ManifestView): LetterPart[] {
  const stopOf = (crateId: string) => {
    const stop = crates.find((crate) => crate.crateId === crateId)?.stop
    if (stop === undefined || (stop.belowC === null && stop.aboveC === null)) return 'none found'
    return `${stop.belowC === null ? 'none' : `${figure(stop.belowC)}\u00a0°C`} to ${stop.aboveC === null ? 'none' : `${figure(stop.aboveC)}\u00a0°C`}`
  }
  return [
    { kind: 'heading', text: 'Animals and crates' },
    {
      kind: 'table',
      heads: [
        { head: 'Crate' },
        { head: 'Animal, identification' },
        { head: 'Air outside the crate, stop beyond', right: true },
      ],
      rows: all.map((animal): LetterCell[] => [
        { text: `${mark}-${animal.crateLetter}`, mark: true },
        {
          text: [animal.name, animal.breedNote || animal.speciesName].filter(Boolean).join(', '),
          bold: true,
          under: animal.identification,
        },
        { text: stopOf(animal.crateId) },
      ]),
    },
  ]
}

function legs({ legs: all }: ManifestView): LetterPart[] {
  return [
    { kind: 'heading', text: 'Legs' },
    {
      kind: 'table',
      heads: [
        { head: 'Leg' },
        { head: 'Where' },
        { head: 'Starts' },
        { head: 'To spare' },
        { head: 'Air to spare' },
      ],
      rows: all.map(
        ({ ordinal, title, start, verdict, margin, limitWords, decidedWords, crateLetter }): LetterCell[] => [
          { text: String(ordinal), bold: true },
          { text: title },
          { text: localTime(start.ms, start.zone) },
          {
            text: margin.minutes === null ? 'not judged' : minutesToSpare(margin.minutes),
            ...(verdict === null ? {} : { verdict }),
            under: [limitWords, decidedWords].filter(Boolean).join(', '),
          },
          {
            text: [margin.outsideAirC === null ? '' : airMargin(margin.outsideAirC, 'c'), crateLetter]
              .filter(Boolean)
              .join(', '),
          },
        ],
      ),
    },
    {
      kind: 'note',
      text: 'Minutes before the first animal meets the limit named, at worst delay, and how much warmer (low: colder) the outside air may be. Solid frame GO, broken frame GO WITH CONDITIONS.',
    },
  ]
}

function approvals({ approvals: all }: ManifestView): LetterPart[] {
  const none: LetterPart[] = [{ kind: 'paragraph', text: 'No vet has signed this consignment.' }]
  return [
    { kind: 'heading', text: 'Vet' },
    ...(all.length === 0
      ? none
      : all.map((approval): LetterPart => ({
          kind: 'paragraph',
          text: `Approved by ${approval.vetName}, registration ${approval.registration}, ${approval.registrationCountry}, ${at(approval.signedAt)}, on the facts shown. The vet has ${approval.examined ? '' : 'not '}examined the animals.`,
          after: 'This is not a certificate of fitness to travel.',
        }))),
  ]
}

function paper(view: ManifestView, appUrl: string): LetterPart[] {
  return [
    { kind: 'heading', text: 'The paper itself' },
    {
      kind: 'paragraph',
      bold: `Attached: ${view.mark}-revision-${view.revision}.pdf,`,
      text: `digitally signed by ${view.seal.subject}. Document code ${printedCode(view.documentCode)}. Anyone can check it without signing in. The PDF counts, not this mail.`,
    },
    { kind: 'links', links: [{ label: 'Check a paper', url: `${appUrl}/verify`, first: false }] },
    {
      kind: 'note',
      text: `Sent because ${view.shipper.name} is the shipper of ${view.mark}. Made ${at(view.made)}. A decision aid: it takes the place of no veterinarian, no acceptance rule of a carrier and no law of the countries crossed.`,
    },
  ]
}
