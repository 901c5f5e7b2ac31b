import { expect, test } from '@playwright/test'
import { open } from './support/people'

/** A pug through a hot station passes her critical limit: nobody can send it on, sign it or release it. */
test('a critical limit is overridden by nobody', async ({ browser }) => {
  const desk = await open(browser, 'dispatcher')
  await desk.page.goto('/consignments')
  await desk.page
    .locator('tr', { hasText: /Wadi Sahm/ })
    .getByRole('link')
    .first()
    .click()
  await expect(desk.page.getByRole('img', { name: /^Verdict: no-go/i }).first()).toBeVisible()
  await expect(desk.page.getByText(/critical/i).first()).toBeVisible()
  await expect(desk.page.getByText('Nobody may override it').first()).toBeVisible()
  const send = desk.page.getByRole('button', { name: 'Send to the vet' })
  await expect(send).toHaveAttribute('aria-disabled', 'true')
  await expect(desk.page.getByRole('button', { name: /^Release/ })).toHaveCount(0)

  const id = /consignments\/(\d+)/.exec(desk.page.url())?.[1]
  const vet = await open(browser, 'vet')
  await vet.page.goto(`/review/${id}`)
  await expect(vet.page.getByText('Not possible: critical.').first()).toBeVisible()
  await expect(vet.page.getByRole('button', { name: /^Sign \d/ })).toHaveCount(0)
})
