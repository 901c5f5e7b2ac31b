import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { CLOSED_STATES, CONSIGNMENT_STATES, MOVES, STATE_WORDS, nextState } from '@/lib/states/consignment'
import type { ConsignmentMove, ConsignmentState } from '@/lib/states/consignment'

const moves = Object.keys(MOVES) as ConsignmentMove[]

/** Every line there is, written out by hand. */
const LINES = `
draft save draft · assessed save draft · returned save draft · in_review save draft · approved save draft · released save draft
draft assess assessed · returned assess assessed · assessed assess assessed · in_review assess in_review · approved assess approved
assessed submit in_review · in_review approve approved · in_review return returned
approved withdraw returned · released withdraw returned · approved release released · approved lapse assessed
released depart under_way · under_way deliver delivered · under_way stop stopped
draft cancel cancelled · assessed cancel cancelled · returned cancel cancelled · in_review cancel cancelled · approved cancel cancelled · released cancel cancelled
`
  .split(/[\n·]/)
  .map((line) => line.trim())
  .filter((line) => line !== '')

it('has these lines and no other', () => {
  const table = moves.flatMap((move) =>
    CONSIGNMENT_STATES.flatMap((from) => {
      const to = nextState(from, move)
      return to === undefined ? [] : [`${from} ${move} ${to}`]
    }),
  )
  expect(table.sort()).toEqual([...LINES].sort())
})

describe('any run of moves', () => {
  const walk = (run: readonly ConsignmentMove[]) => {
    const path: ConsignmentState[] = ['draft']
    for (const move of run) path.push(nextState(path.at(-1) ?? 'draft', move) ?? path.at(-1) ?? 'draft')
    return path
  }
  const run = fc.array(fc.constantFrom(...moves), { maxLength: 40 })

  it('never leaves a closed state', () => {
    fc.assert(
      fc.property(run, (some) => {
        const path = walk(some)
        const closed = path.findIndex((state) => CLOSED_STATES.includes(state))
        if (closed >= 0) expect(new Set(path.slice(closed)).size).toBe(1)
      }),
    )
  })

  it('is under way only over assessed, in review, approved and released', () => {
    fc.assert(
      fc.property(run, (some) => {
        const path = walk(some)
        const left = path.indexOf('under_way')
        if (left < 0) return
        const before = path.slice(0, left)
        for (const state of ['assessed', 'in_review', 'approved', 'released'] as const)
          expect(before).toContain(state)
      }),
    )
  })
})

it('has a word for every state', () => {
  expect(CONSIGNMENT_STATES.every((state) => STATE_WORDS[state].length > 0)).toBe(true)
})
