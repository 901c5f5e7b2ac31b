import { describe, expect, it } from 'vitest'
import { manifestLetter } from '@/lib/mail/letters/manifest-letter'
import {
  approvalVoidedLetter,
  changeAskedLetter,
  returnedLetter,
  submittedLetter,
} from '@/lib/mail/letters/work-letters'
import { manifest2433 } from '../documents/fixtures/manifest-2433'

const APP = { appUrl: 'https://corran.example' }
const LEAVES = { ms: Date.UTC(2026, 5, 12, 2, 20), zone: 'Europe/London' }
const work = {
  mark: '2441',
  revision: 2,
  journey: 'Peebles to Ravenna, 4 animals',
  firm: 'Corran Animal Couriers',
  url: 'https://corran.example/review/41',
}

/** The words of an HTML part, for comparison with the plain one. */
function wordsOf(html: string): string {
  return html
    .replace(/<head>.*?<\/head>/s, '')
    .replace(/<[^>]+>/g, ' ')
    .replace(/&nbsp;|\u00a0/g, ' ')
    .replace(/&quot;/g, '"')
    .replace(/&lt;/g, '<')
    .replace(/&gt;/g, '>')
    .replace(/&amp;/g, '&')
    .replace(/\s+/g, ' ')
}

describe('the manifest’s mail', () => {
  const letter = manifestLetter(manifest2433, APP)

  it('says verdict, conditions and by when in its subject', () => {
    expect(letter.subject.replace(/\u00a0/g, ' ')).toBe(
      '2433, revision 5: GO WITH CONDITIONS, 3 conditions. To acknowledge by 13:40 BST',
    )
  })

  it('says the same in both parts and in the same order', () => {
    const html = wordsOf(letter.html)
    const wanted = [
      'Least to spare: 26 min',
      'Acknowledge revision 5',
      'The journey',
      'It replaces revision 4: throw that one away.',
      'Conditions',
      'Ramp 30 min at most, hold door to shed door; times written down, leg 7',
      'Animals and crates',
      '2433-C',
      '8 °C to 26 °C',
      'Airborne, Skerrow 238',
      'S. Halloway-Odu',
      'The vet has not examined the animals.',
      'This is not a certificate of fitness to travel.',
      '+44 141 496 0388',
      'R4XT-96KW',
      'A decision aid',
    ]
    for (const part of [html, letter.text.replace(/\s+/g, ' ')]) {
      const places = wanted.map((words) => part.indexOf(words))
      expect(
        places.every((place) => place >= 0),
        wanted[places.indexOf(-1)],
      ).toBe(true)
      expect(places).toEqual([...places].sort((a, b) => a - b))
    }
  })

  it('needs no picture, no script and no style sheet, and links only to this installation', () => {
    expect(letter.html).not.toMatch(/<img|<script|<style|<link|url\(/i)
    const links = [...letter.html.matchAll(/href="([^"]+)"/g)].map(([, url]) => url)
    expect(links.length).toBeGreaterThan(0)
    for (const url of links) expect(url).toMatch(/^https:\/\/corran\.example\//)
  })

  it('shows what people typed as text, never as HTML', () => {
    const sly = manifestLetter(
      { ...manifest2433, consignor: { name: '<b>Kennels</b> & "Sons"', lines: [] } },
      APP,
    )
    expect(sly.html).not.toContain('<b>Kennels</b>')
    expect(wordsOf(sly.html)).toContain('<b>Kennels</b> & "Sons"')
    expect(sly.text).toContain('<b>Kennels</b> & "Sons"')
  })
})

describe('letters that move work on', () => {
  it('keep a subject on one line whatever was typed', () => {
    const { subject } = changeAskedLetter({
      ...work,
      askedBy: 'M. Ferrand-Ito',
      about: 'Later\r\nBcc: all@example.org',
      text: 'One day later',
    })
    expect(subject).toBe('2441: change asked for, Later Bcc: all@example.org')
  })

  it('say who, what, why and where it goes on, in both parts', () => {
    const letters = [
      submittedLetter({ ...work, submittedBy: 'I. Quennell', leaves: LEAVES }),
      returnedLetter({
        ...work,
        returnedBy: 'S. Halloway-Odu',
        crateMarks: ['2441-D'],
        reason: 'Otto’s crate is too small.',
      }),
      approvalVoidedLetter({
        ...work,
        crateMarks: ['2441-A', '2441-B'],
        because: 'S. Halloway-Odu withdrew it',
        reason: 'The hold is another one.',
        voidedAt: LEAVES,
      }),
      changeAskedLetter({ ...work, askedBy: 'M. Ferrand-Ito', about: 'departure', text: 'One day later' }),
    ]
    const said = [
      ['I. Quennell', '03:20 BST'],
      ['S. Halloway-Odu', '2441-D', 'Otto’s crate is too small.'],
      ['2441-A, 2441-B', 'S. Halloway-Odu withdrew it', 'The hold is another one.', '03:20 BST'],
      ['M. Ferrand-Ito', 'One day later'],
    ]
    letters.forEach((letter, index) => {
      for (const part of [wordsOf(letter.html), letter.text])
        for (const words of said[index] ?? []) expect(part.replace(/\u00a0/g, ' ')).toContain(words)
      expect(letter.text).toContain(work.url)
      expect(letter.html).toContain(`href="${work.url}"`)
    })
  })
})
