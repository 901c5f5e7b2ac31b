import { expect, test } from '@playwright/test'
import { textOf } from '../documents/support/pdf-tools'
import { mailedPdf } from './support/mails'
import { DEMO_PASSWORD, open } from './support/people'

const REASON = 'Examined this morning; he travels in a fleece and lies on 40 mm of shavings.'

/** A thin-coated cat works too hard at keeping warm: a vet overrides that one finding by name, and it shows ever after. */
test('a vet overrides a finding by name, and the paper says who and why', async ({ browser, request }) => {
  test.setTimeout(240_000)
  const desk = await open(browser, 'dispatcher')
  const found = await desk.context.request.get('/api/consignments?find=Vesper')
  const { rows } = (await found.json()) as { rows: { id: number; mark: string }[] }
  const { id, mark } = rows[0] ?? { id: 0, mark: '' }
  await desk.page.goto(`/consignments/${id}`)
  await expect(desk.page.getByRole('img', { name: /^Verdict: no-go/i }).first()).toBeVisible()
  await expect(desk.page.getByText('A vet may override it').first()).toBeVisible()

  const vet = await open(browser, 'vet')
  await vet.page.goto(`/review/${id}`)
  const sign = vet.page.getByRole('button', { name: `Sign ${mark}-A` })
  await expect(vet.page.getByText(/not open: one breach is not overridden/)).toBeVisible()
  await vet.page.getByRole('checkbox', { name: /^I override this finding.*Keeping warm/ }).check()
  await vet.page.getByRole('radio', { name: 'Approve with conditions' }).check()
  await vet.page.getByRole('radio', { name: 'I have examined the animals' }).check()
  await vet.page.getByLabel('Your password, again').fill(DEMO_PASSWORD)
  await expect(sign).toHaveAttribute('aria-disabled', 'true')
  await vet.page.getByRole('textbox', { name: /^Why you override/ }).fill(REASON)
  await sign.click()
  await expect(vet.page.getByRole('heading', { name: 'Signed', exact: true })).toBeVisible()

  await desk.page.goto(`/consignments/${id}`)
  await expect(desk.page.getByRole('img', { name: /^Verdict: go with conditions/i }).first()).toBeVisible()
  await expect(desk.page.getByText(/Overridden/).first()).toBeVisible()
  await expect(desk.page.getByText(/Sunniva Halloway-Odu/).first()).toBeVisible()
  await expect(desk.page.getByText(/overridden by the vet: 3.°C inside/)).toBeVisible()
  await desk.page.getByRole('button', { name: `Release ${mark}` }).click()
  await desk.page
    .getByRole('dialog')
    .getByRole('button', { name: `Release ${mark}` })
    .click()
  await expect(desk.page.getByText('Released, 1')).toBeVisible({ timeout: 90_000 })

  const { pdf } = await mailedPdf(request, `${mark}, revision 1`)
  const words = (await textOf(pdf)).replace(/\s+/g, ' ')
  expect(words).toMatch(/overridden/i)
  expect(words).toContain(REASON)
  expect([...desk.errors, ...vet.errors]).toEqual([])
})
