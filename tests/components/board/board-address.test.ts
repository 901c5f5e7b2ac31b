import { describe, expect, it } from 'vitest'
import { asked, boardAddressOf, boardSearch, earlierPage, laterPage } from '@/components/board/board-address'

const at = (search: string) => boardAddressOf(new URLSearchParams(search))

describe('the board in the address', () => {
  it('comes back from its address as it was', () => {
    const search =
      'find=moss&state=draft&state=returned&verdict=no-go&holder=vet&leavesFrom=2026-06-08&closed=1&sort=margin&descending=1'
    expect(boardSearch(at(search))).toBe(search)
    expect(boardSearch(at(''))).toBe('')
  })

  it('lets nothing in that it does not know', () => {
    expect(boardSearch(at('sort=price&holder=me&state=lost&leavesFrom=soon&limit=9999'))).toBe('')
  })

  it('goes later and back again the way it came', () => {
    const first = at('find=moss')
    const second = laterPage(first, 'K1')
    const third = laterPage(second, 'K2')
    expect(third.query.after).toBe('K2')
    const back = earlierPage(at(boardSearch(third)))
    expect(back?.query.after).toBe('K1')
    expect(boardSearch(earlierPage(back ?? first) ?? second)).toBe(boardSearch(first))
    expect(earlierPage(first)).toBeNull()
  })

  it('begins another question at its first rows', () => {
    expect(boardSearch(asked(laterPage(at(''), 'K1'), { find: 'fern' }))).toBe('find=fern')
  })
})
