import type { Page } from '@playwright/test'
import { expect, test } from '@playwright/test'
import { open } from './support/people'

/** The worker's row as it stood on the page, every time it changed. */
interface Seen {
  words: string
  filled: number
  holes: number
}

/** Nine legs take the worker a while: whoever waits sees how far it has come, leg by leg, and then the verdict. */
test('the row of holes fills while an assessment runs', async ({ browser }) => {
  test.setTimeout(300_000)
  const { page, errors } = await open(browser, 'dispatcher')
  await watchRow(page)
  await page.goto('/consignments')
  await page
    .locator('tr', { hasText: /Wadi Sahm/ })
    .getByRole('link')
    .first()
    .click()
  await expect(page).toHaveURL(/consignments\/\d+/)
  const address = new URL(page.url()).pathname
  await page.goto(`${address}/plan`)
  await page
    .getByRole('button', { name: /^Open.*animals/i })
    .first()
    .click()
  const mass = page.getByLabel(/^Mass, each/)
  const before = Number(await mass.inputValue())
  await mass.fill(String(before + 0.1))
  await page.getByRole('button', { name: /^Assess/ }).click()
  await expect(page).toHaveURL(new RegExp(`${address}$`), { timeout: 60_000 })
  await expect(page.getByText(/^Assessed, \d/)).toBeVisible({ timeout: 180_000 })

  const rows = await page.evaluate(() => (window as unknown as { rowsSeen: Seen[] }).rowsSeen)
  const told = rows.map(({ words }) => words).join('\n')
  const running = rows.filter(({ words }) => /\d+ of about \d+ runs/.test(words))
  const runs = running.map(({ words }) => Number(/(\d+) of about/.exec(words)?.[1]))
  expect(new Set(runs).size, told).toBeGreaterThan(1)
  expect(runs, 'never backwards').toEqual([...runs].sort((a, b) => a - b))
  // A hole for each of the nine legs, and as many filled as legs lie behind.
  const byLeg = running.flatMap(({ words, filled, holes }) => {
    const [, leg, of] = /leg (\d+) of (\d+)/.exec(words) ?? []
    return leg === undefined ? [] : [{ behind: Number(leg) - 1, of: Number(of), filled, holes }]
  })
  expect(byLeg.length, told).toBeGreaterThan(0)
  for (const { behind, of, filled, holes } of byLeg) expect([filled, holes]).toEqual([behind, of])
  expect(Math.max(...byLeg.map(({ filled }) => filled)), told).toBeGreaterThan(0)
  expect(errors).toEqual([])
})

/** Writes down the row at every change of the page, from before its first script runs. */
async function watchRow(page: Page) {
  await page.addInitScript(() => {
    const seen: { words: string; filled: number; holes: number }[] = []
    Object.assign(window, { rowsSeen: seen })
    new MutationObserver(() => {
      const row = [...document.querySelectorAll('[role=status]')].find((one) =>
        /runs/.test(one.textContent ?? ''),
      )
      if (row === undefined) return
      const holes = [...row.querySelectorAll('circle')]
      const now = {
        words: row.textContent ?? '',
        filled: holes.filter((hole) => getComputedStyle(hole).fill !== 'none').length,
        holes: holes.length,
      }
      if (JSON.stringify(seen.at(-1)) !== JSON.stringify(now)) seen.push(now)
    }).observe(document, { subtree: true, childList: true, characterData: true, attributes: true })
  })
}
