import { readFileSync, readdirSync } from 'node:fs'
import path from 'node:path'
import { expect, it } from 'vitest'
import { verbWords } from '@/components/consignments/history-words'
import { OUTBOX_STATES } from '@/models/outbox-message'

/** Every verb written literally anywhere in the application's own code, where it records or is tried. */
function verbsWritten(folder: string): string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts'))
    .flatMap((file) => [
      ...readFileSync(path.join(folder, file), 'utf8').matchAll(/\bverb: '([a-z-]+\.[a-z-]+)'/g),
    ])
    .flatMap(([, verb]) => verb ?? [])
}

/** Lines that never carry a consignment, so that no consignment's history shows them. */
const OF_NO_CONSIGNMENT = /^(user|document)\.(?!download)/

it('the history of a consignment says every act in words', () => {
  const road = ['depart', 'deliver', 'stop'].map((verb) => `consignment.${verb}`)
  const mails = OUTBOX_STATES.filter((state) => ['sent', 'uncertain', 'failed'].includes(state))
  const verbs = [...verbsWritten('lib'), ...road, ...mails.map((state) => `mail.${state}`)]
  expect(verbs.length).toBeGreaterThan(15)
  const bare = verbs
    .filter((verb) => !OF_NO_CONSIGNMENT.test(verb))
    .filter((verb) =>
      verbWords({ verb, refused: false })
        .toLowerCase()
        .startsWith(verb.split('.')[0] ?? ''),
    )
  expect(bare).toEqual([])
})

it('and what was refused as refused', () => {
  expect(verbWords({ verb: 'approval.approve.refused', refused: true })).toBe('Refused: signed')
})
