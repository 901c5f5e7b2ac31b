import type { Config } from 'tailwindcss'
import plugin from 'tailwindcss/plugin'
import {
  COLOUR_NAMES,
  COLOURS,
  FACES,
  PAPER_TYPE,
  PHONE_TYPE,
  RAMP,
  RAMP_NAMES,
  SCREENS,
  TYPE,
} from './lib/tokens'
import type { Light } from './lib/tokens'

/**
 * Everything here is computed from lib/tokens.ts; colours are variables, so that night and paper need no second set of classes.
 * Distances are Tailwind's own steps of 4 px; the ones in use are SPACE in lib/tokens.ts.
 */
const config: Config = {
  content: ['./app/**/*.tsx', './components/**/*.tsx'],
  theme: {
    colors: colours(),
    screens: Object.fromEntries(Object.entries(SCREENS).map(([name, px]) => [name, `${px}px`])),
    fontFamily: Object.fromEntries(Object.keys(FACES).map((face) => [face, `var(--f-${face})`])),
    fontSize: Object.fromEntries(
      Object.keys(TYPE).map((name) => [name, [`var(--t-${name})`, { lineHeight: `var(--l-${name})` }]]),
    ),
    borderRadius: { none: '0', hole: '50%' },
    boxShadow: {},
    dropShadow: {},
    extend: {},
  },
  plugins: [
    plugin(({ addBase }) => {
      addBase({
        ':root': { ...inks('day'), ...faces(), ...sizes(TYPE), 'color-scheme': 'light' },
        [`@media screen and (width < ${SCREENS.desk}px)`]: { ':root': sizes(PHONE_TYPE) },
        '[data-theme=night]': { ...inks('night'), 'color-scheme': 'dark' },
        '@media (prefers-color-scheme: dark)': {
          '[data-theme=system]': { ...inks('night'), 'color-scheme': 'dark' },
        },
        '@media print': {
          ':root, [data-theme]': { ...inks('paper'), ...sizes(PAPER_TYPE), 'color-scheme': 'light' },
        },
      })
    }),
  ],
}

export default config

function rem(px: number): string {
  return px === 1 ? '1px' : `${px / 16}rem`
}

function colours(): Record<string, string> {
  const names = [...COLOUR_NAMES, ...RAMP_NAMES, ...RAMP_NAMES.map((name) => `${name}t`)]
  return {
    transparent: 'transparent',
    current: 'currentColor',
    ...Object.fromEntries(names.map((name) => [name, `var(--${name})`])),
  }
}

/** Custom properties of one light. Paper keeps the day ramp. */
function inks(light: Light): Record<string, string> {
  const ramp = RAMP.flatMap((step) => {
    const { fill, text } = light === 'night' ? step.night : step.day
    return [
      [`--${step.name}`, fill],
      [`--${step.name}t`, text],
    ]
  })
  return Object.fromEntries([
    ...Object.entries(COLOURS[light]).map(([name, value]) => [`--${name}`, value]),
    ...ramp,
  ])
}

/** Size and line of each name, so that a phone can overrule them without a second set of classes. */
function sizes(type: Record<string, readonly [number, number] | undefined>): Record<string, string> {
  return Object.fromEntries(
    Object.entries(type).flatMap(([name, step]) =>
      step
        ? [
            [`--t-${name}`, rem(step[0])],
            [`--l-${name}`, rem(step[1])],
          ]
        : [],
    ),
  )
}

/** next/font names its families itself and hands them over as --face-… (app/fonts.ts). */
function faces(): Record<string, string> {
  return Object.fromEntries(
    Object.entries(FACES).map(([face, { fallback }]) => [
      `--f-${face}`,
      `var(--face-${face}),var(--face-${face}-ext,var(--face-${face})),${fallback}`,
    ]),
  )
}
