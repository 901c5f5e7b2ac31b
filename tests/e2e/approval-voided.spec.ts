import { expect, test } from '@playwright/test'
import { DEMO_PASSWORD, open } from './support/people'
import { assess, typePlan } from './support/plan-editor'

/** A change to what was signed voids the signature, and the page says so plainly. */
test('a change to the plan voids the approval', async ({ browser }) => {
  test.setTimeout(300_000)
  const desk = await open(browser, 'dispatcher')
  await desk.page.goto('/consignments/new')
  await typePlan(desk.page, {
    animal: { name: 'Pippin', species: 'Cat', breed: 'Domestic shorthair', massKg: '4.2' },
    crateModel: /cat and small dog/,
    startsInHours: 9,
    hours: 1,
    outsideAirC: '14',
    setPointC: '20',
    driver: 'Maren Tolvaag',
  })
  const { id, mark } = await assess(desk.page)
  await desk.page.getByRole('button', { name: 'Send to the vet' }).click()
  await expect(desk.page.getByText('In review, 1')).toBeVisible()

  const vet = await open(browser, 'vet')
  await vet.page.goto(`/review/${id}`)
  await vet.page.getByRole('radio', { name: 'Approve', exact: true }).check()
  await vet.page.getByRole('radio', { name: 'I have examined the animals' }).check()
  await vet.page.getByLabel('Your password, again').fill(DEMO_PASSWORD)
  await vet.page.getByRole('button', { name: `Sign ${mark}-A` }).click()
  await expect(vet.page.getByRole('heading', { name: 'Signed', exact: true })).toBeVisible()

  await desk.page.goto(`/consignments/${id}/plan`)
  await desk.page
    .getByRole('button', { name: /^Open.*animals/i })
    .first()
    .click()
  await desk.page.getByLabel(/^Mass, each/).fill('4.9')
  await desk.page.getByRole('button', { name: /^Save the plan/ }).click()
  await expect(desk.page.getByText(/void/i).first()).toBeVisible()

  await desk.page.goto(`/consignments/${id}`)
  await expect(desk.page.getByText('Draft, 1')).toBeVisible()
  await expect(desk.page.getByRole('region', { name: 'Approvals' }).getByText(/void/i).first()).toBeVisible()
  await expect(desk.page.getByRole('button', { name: /^Release/ })).toHaveCount(0)
})
