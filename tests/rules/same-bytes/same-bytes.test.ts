import { readFileSync, readdirSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { type Browser, type Page, chromium } from '@playwright/test'
import { build } from 'esbuild'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Scenario } from '@/lib/thermal'
import type * as bundle from './bundle'
import { hashAssessment, hashTracks } from './bundle'

/*
 * The same scenario gives the same bytes in Node and in Chromium. Both run V8, and yet their own exp, log, pow and cos
 * differ in the last bit of some arguments, so this would not hold by itself.
 */

const here = path.dirname(fileURLToPath(import.meta.url))
const folder = path.resolve(here, '../../thermal/scenarios')
const scenarios = readdirSync(folder)
  .filter((name) => name.endsWith('.json'))
  .sort()
  .map((name) => ({ name, scenario: JSON.parse(readFileSync(path.join(folder, name), 'utf8')) as Scenario }))

/** Assessed in full besides: one of each kind of trouble, short enough to be assessed twice. */
const ASSESSED = ['pug-on-a-hot-ramp.json', 'van-that-loses-its-cooling.json', 'wet-dog-in-the-wind.json']

describe('in Node and in Chromium', () => {
  let browser: Browser
  let page: Page

  beforeAll(async () => {
    const bundled = await build({
      entryPoints: [path.join(here, 'bundle.ts')],
      bundle: true,
      write: false,
      format: 'iife',
      globalName: 'steadfold',
      platform: 'browser',
      target: 'es2022',
      tsconfig: path.resolve(here, '../../../tsconfig.json'),
    })
    browser = await chromium.launch({
      executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    })
    page = await browser.newPage()
    await page.addScriptTag({ content: bundled.outputFiles[0]?.text ?? '' })
  }, 120_000)

  afterAll(() => browser.close())

  it('there are at least ten scenarios to compare', () => {
    expect(scenarios.length).toBeGreaterThanOrEqual(10)
  })

  it.each(scenarios)(
    'tracks of $name are the same bytes',
    async ({ scenario }) => {
      expect(await inChromium(page, 'hashTracks', scenario)).toBe(hashTracks(scenario))
    },
    120_000,
  )

  it.each(ASSESSED)(
    'the assessment of %s is the same bytes',
    async (name) => {
      const scenario = scenarios.find((one) => one.name === name)?.scenario
      if (scenario === undefined) throw new Error(`No scenario ${name}.`)
      expect(await inChromium(page, 'hashAssessment', scenario)).toBe(hashAssessment(scenario))
    },
    120_000,
  )
})

type Compared = typeof bundle

function inChromium(page: Page, what: keyof Compared, scenario: Scenario): Promise<string> {
  return page.evaluate(
    ([name, document]) => (globalThis as unknown as { steadfold: Compared }).steadfold[name](document),
    [what, scenario] as const,
  )
}
