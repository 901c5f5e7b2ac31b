import localFont from 'next/font/local'

/*
 * Each face in two files, Latin and extended Latin, as two families: a unicode-range holds for a whole next/font family,
 * and without it a browser would fetch both. tokens.ts joins them to one stack (--f-head is --face-head, --face-head-ext, …).
 */
const head = localFont({
  variable: '--face-head',
  display: 'swap',
  adjustFontFallback: false,
  src: [
    { path: '../fonts/web/aleo-latin-700-normal.woff2', weight: '700' },
    { path: '../fonts/web/aleo-latin-600-normal.woff2', weight: '600' },
    { path: '../fonts/web/aleo-latin-800-normal.woff2', weight: '800' },
    { path: '../fonts/web/aleo-latin-600-italic.woff2', weight: '600', style: 'italic' },
  ],
  preload: true,
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF,U+0131,U+0152-0153,U+02BB-02BC,U+02C6,U+02DA,U+02DC,U+0304,U+0308,U+0329,U+2000-206F,U+20AC,U+2122,U+2191,U+2193,U+2212,U+2215,U+FEFF,U+FFFD',
    },
  ],
})

const headExt = localFont({
  variable: '--face-head-ext',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  src: [
    { path: '../fonts/web/aleo-latin-ext-700-normal.woff2', weight: '700' },
    { path: '../fonts/web/aleo-latin-ext-600-normal.woff2', weight: '600' },
    { path: '../fonts/web/aleo-latin-ext-800-normal.woff2', weight: '800' },
  ],
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+0329,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF',
    },
  ],
})

const text = localFont({
  variable: '--face-text',
  display: 'swap',
  adjustFontFallback: false,
  preload: true,
  src: [
    { path: '../fonts/web/atkinson-hyperlegible-next-latin-400-normal.woff2', weight: '400' },
    { path: '../fonts/web/atkinson-hyperlegible-next-latin-600-normal.woff2', weight: '600' },
    { path: '../fonts/web/atkinson-hyperlegible-next-latin-700-normal.woff2', weight: '700' },
  ],
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF,U+0131,U+0152-0153,U+02BB-02BC,U+02C6,U+02DA,U+02DC,U+0304,U+0308,U+0329,U+2000-206F,U+20AC,U+2122,U+2191,U+2193,U+2212,U+2215,U+FEFF,U+FFFD',
    },
  ],
})

const textExt = localFont({
  variable: '--face-text-ext',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  src: [
    { path: '../fonts/web/atkinson-hyperlegible-next-latin-ext-400-normal.woff2', weight: '400' },
    { path: '../fonts/web/atkinson-hyperlegible-next-latin-ext-600-normal.woff2', weight: '600' },
    { path: '../fonts/web/atkinson-hyperlegible-next-latin-ext-700-normal.woff2', weight: '700' },
  ],
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+0329,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF',
    },
  ],
})

const fig = localFont({
  variable: '--face-fig',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  src: [
    { path: '../fonts/web/atkinson-hyperlegible-mono-latin-400-normal.woff2', weight: '400' },
    { path: '../fonts/web/atkinson-hyperlegible-mono-latin-600-normal.woff2', weight: '600' },
  ],
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF,U+0131,U+0152-0153,U+02BB-02BC,U+02C6,U+02DA,U+02DC,U+0304,U+0308,U+0329,U+2000-206F,U+20AC,U+2122,U+2191,U+2193,U+2212,U+2215,U+FEFF,U+FFFD',
    },
  ],
})

const figExt = localFont({
  variable: '--face-fig-ext',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  src: [
    { path: '../fonts/web/atkinson-hyperlegible-mono-latin-ext-400-normal.woff2', weight: '400' },
    { path: '../fonts/web/atkinson-hyperlegible-mono-latin-ext-600-normal.woff2', weight: '600' },
  ],
  declarations: [
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+0329,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF',
    },
  ],
})

/** Marks are letters A to Z and figures: one Latin file is enough. */
const crate = localFont({
  variable: '--face-crate',
  display: 'swap',
  adjustFontFallback: false,
  preload: false,
  src: [{ path: '../fonts/web/saira-stencil-one-latin-400-normal.woff2', weight: '400' }],
})

/** Class names that define the font variables on <html>. */
export const fontVariables = [head, headExt, text, textExt, fig, figExt, crate]
  .map((font) => font.variable)
  .join(' ')
