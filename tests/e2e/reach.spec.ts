import AxeBuilder from '@axe-core/playwright'
import { expect, test } from '@playwright/test'
import type { Who } from './support/people'
import { open } from './support/people'

/** Every role's pages, at phone and desk width: nothing serious for axe, nothing wider than the window. */
const PAGES: readonly [Who | null, readonly string[]][] = [
  [null, ['/sign-in', '/verify']],
  [
    'dispatcher',
    [
      '/consignments',
      '/consignments/3',
      '/consignments/4/sheet',
      '/consignments/8/plan',
      '/species',
      '/species/dog',
    ],
  ],
  ['vet', ['/review', '/review/5']],
  ['driver', ['/runs', '/runs/4']],
  ['shipper', ['/portal', '/portal/4']],
  ['admin', ['/admin/users', '/admin/mail', '/admin/audit', '/admin/certificate']],
]

for (const [who, paths] of PAGES) {
  test(`pages of ${who ?? 'anybody'} are within reach`, async ({ browser }) => {
    test.setTimeout(300_000)
    const { page, errors } = await open(browser, who)
    for (const path of paths) {
      for (const width of [390, 1280]) {
        await page.setViewportSize({ width, height: 900 })
        await page.goto(path)
        await expect(page.getByRole('heading', { level: 1 }).first()).toBeVisible()
        // Charts are redrawn once they know their width: what counts is the page when it has settled.
        await expect
          .poll(() => page.evaluate(() => document.documentElement.scrollWidth), {
            message: `${path} at ${width}`,
          })
          .toBeLessThanOrEqual(width)
        const { violations } = await new AxeBuilder({ page }).analyze()
        const serious = violations.filter(({ impact }) => impact === 'serious' || impact === 'critical')
        expect(serious.map(({ id, nodes }) => `${path} at ${width}: ${id} ${nodes[0]?.html ?? ''}`)).toEqual(
          [],
        )
      }
    }
    expect(errors).toEqual([])
  })
}
