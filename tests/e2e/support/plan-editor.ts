import { expect } from '@playwright/test'
import type { Page } from '@playwright/test'
import { formatInTimeZone } from 'date-fns-tz'

const ZONE = 'Europe/London'

/** A wall time in Scotland some hours from now, as the form takes it. */
export function inHours(hours: number): string {
  const quarter = 15 * 60_000
  const at = Math.round((Date.now() + hours * 3_600_000) / quarter) * quarter
  return formatInTimeZone(new Date(at), ZONE, 'yyyy-MM-dd HH:mm')
}

export interface TypedPlan {
  animal: { name: string; species: string; breed: string; massKg: string; flag?: string }
  crateModel: RegExp
  startsInHours: number
  hours: number
  outsideAirC: string
  /** Air the van is held at; absent: a van without conditioning. */
  setPointC?: string
  driver?: string
}

/** Types a whole plan into the editor as a dispatcher would: parties, one animal, one crate, one road leg. */
export async function typePlan(page: Page, plan: TypedPlan): Promise<void> {
  await typeParties(page)
  await typeAnimal(page, plan.animal)
  await typeCrate(page, plan)
  await typeLeg(page, plan)
}

async function typeParties(page: Page) {
  const parties = page.getByRole('region', { name: 'Parties, opened' })
  const fill = async (label: string, ...values: string[]) => {
    for (const [index, value] of values.entries())
      await parties.getByLabel(label, { exact: true }).nth(index).fill(value)
  }
  await fill('Name', 'Moss End Kennels', 'Hallmyre Kennels')
  await fill('Address', '3 Mill Brae, Balfron', 'Hallmyre, Peebles')
  await fill('Telephone', '+44 141 496 0207', '+44 141 496 0211')
  await parties.getByLabel('Shipper').selectOption({ label: 'Strand-Ekdahl family' })
  await parties.getByLabel('Purpose').selectOption({ label: 'Private' })
  await parties.getByLabel(/^Emergency contact/).fill('Jorun Strand-Ekdahl')
  await parties.getByLabel('Emergency telephone').fill('+44 7700 900562')
}

async function typeAnimal(page: Page, { name, species, breed, massKg, flag }: TypedPlan['animal']) {
  const animals = page.getByRole('region', { name: 'Animals, opened' })
  await animals.getByRole('button', { name: 'Add an animal' }).click()
  await animals.getByLabel('Name or tag').fill(name)
  await animals.getByLabel('Species').selectOption({ label: species })
  await animals.getByLabel('Breed').fill(breed)
  await animals.getByLabel('Identification').fill('Chip 999 000 0131 80001')
  await animals.getByLabel('Age').fill('1500')
  await animals.getByLabel(/^Mass, each/).fill(massKg)
  await animals.getByLabel('Crate-trained').check()
  if (flag !== undefined) await animals.getByLabel(flag, { exact: false }).first().check()
  await animals.getByLabel('Temperament').selectOption({ label: 'Calm' })
  await animals.getByLabel('Last fed').fill(inHours(-2))
  await animals.getByLabel('Last watered').fill(inHours(-1))
}

async function typeCrate(page: Page, { crateModel, animal }: TypedPlan) {
  const crates = page.getByRole('region', { name: 'Crates, opened' })
  const models = crates.getByLabel('Add a crate')
  const label = (await models.locator('option').allTextContents()).find((text) => crateModel.test(text)) ?? ''
  await models.selectOption({ label })
  await crates.getByLabel(animal.name).check()
}

async function typeLeg(page: Page, plan: TypedPlan) {
  await page.getByLabel('Add a leg').selectOption({ label: 'Road' })
  const leg = page.getByRole('group', { name: /^Leg 1, / })
  await leg.getByLabel('From', { exact: true }).selectOption({ label: 'Moss End Kennels, Balfron' })
  await leg.getByLabel('To', { exact: true }).selectOption({ label: 'Hallmyre Kennels, Peebles' })
  await leg.getByLabel('Start, local').fill(inHours(plan.startsInHours))
  await leg.getByLabel('End, local').fill(inHours(plan.startsInHours + plan.hours))
  await leg.getByLabel('Party in charge').fill('Corran Animal Couriers')
  await leg.getByLabel('Telephone').fill('+44 141 496 0100')
  if (plan.driver !== undefined) {
    await leg.getByLabel('One of ours stands beside the crates').check()
    await leg.getByLabel('Who of ours').selectOption({ label: plan.driver })
  }
  await leg.getByLabel('Fresh air').fill('240')
  if (plan.setPointC !== undefined) {
    await leg.getByLabel('Cooled or heated to a set-point').check()
    await leg.getByLabel('Set-point', { exact: true }).fill(plan.setPointC)
    await leg.getByLabel('Cooling', { exact: true }).fill('3500')
    await leg.getByLabel('Heating', { exact: true }).fill('4000')
    await leg.getByLabel('Air at start').fill(plan.setPointC)
  }
  const air = {
    'Row 1, air': plan.outsideAirC,
    'Row 1, humidity': '70',
    'Row 1, sun': '50',
  }
  for (const [label, value] of Object.entries(air)) await leg.getByLabel(label, { exact: true }).fill(value)
}

/** Asks for an assessment from the editor and waits until the worker has answered. */
export async function assess(page: Page): Promise<{ id: number; mark: string }> {
  await page.getByRole('button', { name: /^Assess/ }).click()
  await expect(page).toHaveURL(/consignments\/\d+$/, { timeout: 60_000 })
  await expect(page.getByText(/^Assessed, \d/)).toBeVisible({ timeout: 120_000 })
  const heading = await page.getByRole('heading', { level: 1 }).textContent()
  const mark = /\d{4}/.exec(heading ?? '')?.[0] ?? ''
  return { id: Number(new URL(page.url()).pathname.split('/').at(-1)), mark }
}
