import { expect, it } from 'vitest'
import { conditionAnswerSchema } from '@/lib/schemas/act'
import { approveSchema } from '@/lib/schemas/approval'

const REQUEST = '0b0e9f1c-6f0a-4a6e-9a53-6f6d1f5b7c11'

const approval = (more: object) =>
  approveSchema.safeParse({
    consignmentId: 1,
    requestId: REQUEST,
    crateIds: ['crate-1'],
    planHash: 'a'.repeat(64),
    password: 'a password',
    examined: true,
    conditions: [],
    earlySigns: [],
    overrides: [],
    ...more,
  })
const issues = (parsed: { error?: { issues: { path: PropertyKey[]; message: string }[] } }) =>
  parsed.error?.issues.map(({ path, message }) => `${path.join('.')}: ${message}`) ?? []

it('a vet signs only words the paper can show, and is told the letter and the field before signing', () => {
  const said = issues(
    approval({
      conditions: [
        { text: 'Shed at 18 °C.', legId: null, party: 'Łódź Cargo' },
        { text: 'Без воды', legId: null, party: '犬舎' },
      ],
      earlySigns: [{ crateId: 'crate-1', text: 'Drools 🐕' }],
      overrides: [{ findingIndex: 0, reason: 'Seen and measured ≤ 39 °C, Γαία' }],
    }),
  )
  expect(said.map((words) => words.split(':')[0])).toEqual([
    'conditions.1.text',
    'conditions.1.party',
    'earlySigns.0.text',
    'overrides.0.reason',
  ])
  expect(said[2]).toContain('“Drools 🐕” holds “🐕”, which the paper cannot show')
  expect(said[3]).toContain('holds “Γ”, “α”, “ί”, which')
})

it('lets pass what stands in European passports', () => {
  const words = 'Žluťoučký, Ærø, Şırnak, Győr, Ħamrun, Þór: ≤ 24 °C'
  expect(
    issues(
      approval({
        conditions: [{ text: words, legId: null, party: words }],
        overrides: [{ findingIndex: 0, reason: words }],
      }),
    ),
  ).toEqual([])
})

it('whoever answered a condition is named on the paper, too', () => {
  const answer = {
    conditionId: 1,
    requestId: REQUEST,
    answer: 'confirmed',
    how: 'telephone',
    note: 'по телефону',
  }
  expect(issues(conditionAnswerSchema.safeParse({ ...answer, answeredBy: 'D. Aird' }))).toEqual([])
  expect(issues(conditionAnswerSchema.safeParse({ ...answer, answeredBy: 'Д. Aird' }))).toEqual([
    'answeredBy: “Д. Aird” holds “Д”, which the paper cannot show. Write it in Latin letters, as in the passport.',
  ])
})
