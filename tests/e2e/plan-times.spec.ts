import type { Page } from '@playwright/test'
import { expect, test } from '@playwright/test'
import { nextClockChanges } from './support/clock-changes'
import { open } from './support/people'
import { typePlan } from './support/plan-editor'

/*
 * The two nights on which a wall time in Scotland names no instant, or two. The browser stands in the same zone: a
 * calendar that reads wall times in the reader's own zone gets both wrong without a word.
 */
const { missing, doubled } = nextClockChanges('Europe/London', new Date())

test('an hour the clock skips is refused by name, and nothing else typed is lost', async ({ browser }) => {
  test.setTimeout(300_000)
  const { page, errors } = await open(browser, 'dispatcher')
  await page.goto('/consignments/new')
  await typeLurcher(page, 'Wren')
  await leg(page).getByLabel('Start, local').fill(missing)
  await leg(page)
    .getByLabel('End, local')
    .fill(`${missing.slice(0, 10)} 05:00`)
  await leg(page).getByLabel('Note for this leg').fill('Ring the bell twice.')

  const sentence = `the clock at Moss End Kennels, Balfron never shows ${missing}, it goes from GMT (UTC) to BST (UTC+1) there`
  await expect(leg(page).getByText(sentence)).toBeVisible()
  await expect(leg(page).getByLabel('Start, local')).toHaveAttribute('aria-invalid', 'true')
  await page.getByRole('button', { name: /^Assess/ }).click()
  await expect(page.getByRole('heading', { name: /can’t be assessed yet$/ })).toBeVisible()
  await expect(page).toHaveURL(/\/new$/)

  await page.getByRole('button', { name: /^Save the plan/ }).click()
  await expect(page).toHaveURL(/consignments\/\d+\/plan$/, { timeout: 60_000 })
  await page.reload()
  await expect(leg(page).getByText(sentence)).toBeVisible()
  await expect(leg(page).getByLabel('Start, local')).toHaveValue(missing)
  await expect(leg(page).getByLabel('End, local')).toHaveValue(`${missing.slice(0, 10)} 05:00`)
  await expect(leg(page).getByLabel('Note for this leg')).toHaveValue('Ring the bell twice.')
  await expect(leg(page).getByLabel('Fresh air')).toHaveValue('240')
  await expect(page.getByText(/Wren, lurcher, 24/)).toBeVisible()

  // Half an hour later by the sun the clock shows an hour more, and that there is.
  const next = missing.replace(' 01:', ' 02:')
  await leg(page).getByLabel('Start, local').fill(next)
  await expect(leg(page).getByText(sentence)).toBeHidden()
  await expect(
    leg(page)
      .getByText(/BST \(UTC\+1\)/)
      .first(),
  ).toBeVisible()
  expect(errors).toEqual([])
})

test('an hour the clock shows twice is asked for, and the answer kept', async ({ browser }) => {
  test.setTimeout(300_000)
  const { page, errors } = await open(browser, 'dispatcher')
  await page.goto('/consignments/new')
  await typeLurcher(page, 'Teal')
  await leg(page).getByLabel('Start, local').fill(doubled)
  await leg(page)
    .getByLabel('End, local')
    .fill(`${doubled.slice(0, 10)} 04:00`)

  const first = leg(page).getByRole('radio', { name: 'first, BST (UTC+1)' })
  const second = leg(page).getByRole('radio', { name: 'second, GMT (UTC)' })
  await expect(first).not.toBeChecked()
  await expect(second).not.toBeChecked()
  const asked = `shows ${doubled} twice. Choose BST (UTC+1) or GMT (UTC).`
  await expect(leg(page).getByText(asked)).toBeVisible()

  // 01:30 the first time is 00:30 UTC, the second time 01:30 UTC; 04:00 in winter is 04:00 UTC.
  await first.check()
  await expect(leg(page).getByText('3:30 h:min')).toBeVisible()
  await second.check()
  await expect(leg(page).getByText('2:30 h:min')).toBeVisible()
  await expect(leg(page).getByText(asked)).toBeHidden()

  await page.getByRole('button', { name: /^Save the plan/ }).click()
  await expect(page).toHaveURL(/consignments\/\d+\/plan$/, { timeout: 60_000 })
  await page.reload()
  await expect(leg(page).getByLabel('Start, local')).toHaveValue(doubled)
  await expect(second).toBeChecked()
  await expect(first).not.toBeChecked()
  await expect(leg(page).getByText('2:30 h:min')).toBeVisible()
  await expect(page.getByText(/Teal, lurcher, 24/)).toBeVisible()
  await expect(page.getByRole('heading', { name: 'Nothing stands in the way' })).toBeVisible()
  expect(errors).toEqual([])
})

const leg = (page: Page) => page.getByRole('group', { name: /^Leg 1, / })

/** A whole plan by road, fed the evening before whatever night it is moved to. */
async function typeLurcher(page: Page, name: string) {
  await typePlan(page, {
    animal: { name, species: 'Dog', breed: 'Lurcher', massKg: '24' },
    crateModel: /large dog/,
    startsInHours: 30,
    hours: 2,
    outsideAirC: '10',
    setPointC: '18',
    driver: 'Colm Bellweather',
  })
  const animals = page.getByRole('region', { name: 'Animals, opened' })
  await animals.getByLabel('Last fed').fill('')
  await animals.getByLabel('Last watered').fill('')
}
