import type { Browser, BrowserContext, Page } from '@playwright/test'
import { expect } from '@playwright/test'
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../../seeders/demo/people'

export type Who =
  | 'dispatcher'
  | 'second-dispatcher'
  | 'vet'
  | 'driver'
  | 'second-driver'
  | 'shipper'
  | 'second-shipper'
  | 'admin'

export { DEMO_PASSWORD }

export function personOf(who: Who) {
  const person = DEMO_PEOPLE.find(({ key }) => key === who)
  if (person === undefined) throw new Error(`Nobody in the demo is called ${who}.`)
  return person
}

/** Signs in through the form, as a person does. */
export async function signIn(page: Page, who: Who): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(personOf(who).email)
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD)
  await page.getByRole('button', { name: 'Sign in', exact: true }).click()
  await expect(page).not.toHaveURL(/sign-in/)
}

/** A browser of one's own for each person: drivers have a phone. Errors on any page of it are collected. */
export async function open(
  browser: Browser,
  who: Who | null,
): Promise<{ page: Page; context: BrowserContext; errors: string[] }> {
  const phone = who === 'driver' || who === 'second-driver'
  const context = await browser.newContext({
    viewport: phone ? { width: 390, height: 844 } : { width: 1280, height: 900 },
  })
  const page = await context.newPage()
  const errors: string[] = []
  page.on('pageerror', (error) => errors.push(error.message))
  if (who !== null) await signIn(page, who)
  return { page, context, errors }
}
