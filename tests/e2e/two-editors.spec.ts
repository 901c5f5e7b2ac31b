import { expect, test } from '@playwright/test'
import { open } from './support/people'

/** Two dispatchers open the same draft; the second save is refused, shows both versions, and loses neither. */
test('two editors collide and nothing is lost', async ({ browser }) => {
  const first = await open(browser, 'dispatcher')
  const second = await open(browser, 'second-dispatcher')
  await first.page.goto('/consignments')
  await first.page
    .locator('tr', { hasText: /Lorn loft/ })
    .getByRole('link')
    .first()
    .click()
  await expect(first.page).toHaveURL(/consignments\/\d+/)
  const id = /consignments\/(\d+)/.exec(first.page.url())?.[1]
  const plan = `/consignments/${id}/plan`
  await Promise.all([first.page.goto(plan), second.page.goto(plan)])

  const note = async (page: typeof first.page, text: string) => {
    await page
      .getByRole('button', { name: /^Open.*parties/i })
      .first()
      .click()
    await page.getByLabel(/^Handling note/).fill(text)
    await page.getByRole('button', { name: /^Save the plan/ }).click()
  }
  await note(first.page, 'Baskets in the shade at every stop.')
  await expect(first.page.getByText(/^Saved/).first()).toBeVisible()
  await note(second.page, 'Baskets never beside the exhaust.')

  const box = second.page.getByText('Baskets in the shade at every stop.')
  await expect(box.first()).toBeVisible()
  await expect(second.page.getByText('Baskets never beside the exhaust.').first()).toBeVisible()
  await second.page
    .getByRole('button', { name: /^Keep mine/ })
    .first()
    .click()
  await second.page.getByRole('button', { name: /^Save the plan/ }).click()
  await expect(second.page.getByText(/^Saved/).first()).toBeVisible()

  await first.page.reload()
  await first.page
    .getByRole('button', { name: /^Open.*parties/i })
    .first()
    .click()
  await expect(first.page.getByLabel(/^Handling note/)).toHaveValue('Baskets never beside the exhaust.')
})
