import { readFile } from 'node:fs/promises'
import path from 'node:path'
import { expect, test } from '@playwright/test'
import { pdfsig, textOf } from '../documents/support/pdf-tools'
import { mailedPdf } from './support/mails'
import { DEMO_PASSWORD, open } from './support/people'
import { assess, typePlan } from './support/plan-editor'

/** Plan, assess, sign, release, mail, drive, hand over, acknowledge: every role does its part, all of it for real. */
test('one consignment goes the whole way', async ({ browser, request }) => {
  test.setTimeout(420_000)
  const desk = await open(browser, 'dispatcher')
  await desk.page.goto('/consignments/new')
  await typePlan(desk.page, {
    animal: { name: 'Kestrel', species: 'Dog', breed: 'Border collie', massKg: '18' },
    crateModel: /large dog/,
    startsInHours: 6,
    hours: 2,
    outsideAirC: '12',
    setPointC: '18',
    driver: 'Colm Bellweather',
  })
  const { id, mark } = await assess(desk.page)
  await expect(desk.page.getByRole('img', { name: 'Verdict: go', exact: true }).first()).toBeVisible()
  await desk.page.getByRole('button', { name: 'Send to the vet' }).click()
  await expect(desk.page.getByText('In review, 1')).toBeVisible()

  const vet = await open(browser, 'vet')
  await vet.page.goto(`/review/${id}`)
  await expect(vet.page.getByRole('img', { name: /^Crate .* to scale/ })).toBeVisible()
  await vet.page.getByRole('radio', { name: 'Approve', exact: true }).check()
  await vet.page.getByRole('radio', { name: 'I have not examined the animals' }).check()
  await vet.page.getByLabel('Your password, again').fill(DEMO_PASSWORD)
  await vet.page.getByRole('button', { name: `Sign ${mark}-A` }).click()
  await expect(vet.page.getByRole('heading', { name: 'Signed', exact: true })).toBeVisible()

  await desk.page.goto(`/consignments/${id}`)
  await expect(desk.page.getByText('Approved, 1')).toBeVisible()
  await desk.page.getByRole('button', { name: `Release ${mark}` }).click()
  await desk.page
    .getByRole('dialog')
    .getByRole('button', { name: `Release ${mark}` })
    .click()
  await expect(desk.page.getByText('Released, 1')).toBeVisible({ timeout: 90_000 })

  const { mail, pdf } = await mailedPdf(request, `${mark}, revision 1`)
  expect(mail.to).toBe('j.strand@example.org')
  const root = await readFile(path.join(process.env.DATA_DIR ?? '.data', 'signing', 'root.pem'), 'utf8')
  const judged = await pdfsig(pdf, root)
  expect(judged).toContain('Signature is Valid')
  expect(judged).toContain('Total document signed')
  expect(judged).toContain('Certificate is Trusted')
  const words = await textOf(pdf)
  for (const word of [mark, 'Manifest', 'Kestrel', 'Border collie', 'VR 40 817', 'Moss End Kennels'])
    expect(words).toContain(word)

  const road = await open(browser, 'driver')
  await road.page.goto(`/runs/${id}`)
  await expect(road.page.getByRole('region', { name: 'Early signs' })).toContainText('Panting')
  await road.page.getByRole('button', { name: 'We have left' }).click()
  await expect(road.page.getByRole('button', { name: 'Delivered' })).toBeVisible()
  await road.page.getByRole('checkbox', { name: /^Item 1: / }).click()
  await road.page.getByLabel('A Kestrel').fill('17')
  await road.page.getByRole('button', { name: 'Enter the air' }).click()
  await road.page.getByRole('button', { name: 'All well' }).click()
  const handover = road.page.getByRole('listitem').filter({ hasText: 'Hand the crates over' })
  await handover.getByRole('button', { name: 'Now' }).click()
  await handover.getByLabel('Alive').fill('1')
  await handover.getByRole('button', { name: 'Enter the handover' }).click()
  await expect(
    road.page.getByRole('region', { name: 'Your entries on this leg' }).getByRole('listitem'),
  ).toHaveCount(4)

  await road.page.getByRole('button', { name: 'Delivered' }).click()
  await road.page.getByLabel(/^Received by/).fill('R. Aldous, Hallmyre Kennels')
  await road.page.getByRole('button', { name: /^Delivered/ }).click()
  await expect(road.page.getByRole('button', { name: 'Break the journey off' })).toHaveCount(0)

  const home = await open(browser, 'shipper')
  await home.page.goto(`/portal/${id}`)
  await home.page.getByRole('checkbox', { name: 'I have read revision 1' }).check()
  await home.page.getByRole('checkbox', { name: 'The facts about my animals are right' }).check()
  await home.page.getByRole('button', { name: 'Acknowledge revision 1' }).click()
  await expect(home.page.getByRole('heading', { name: 'Revision 1 is acknowledged' })).toBeVisible()

  expect([desk, vet, road, home].flatMap(({ errors }) => errors)).toEqual([])
})
