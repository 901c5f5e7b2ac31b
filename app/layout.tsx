import type { Metadata, Viewport } from 'next'
import type { ReactNode } from 'react'
import { Providers } from '@/components/ui/providers'
import { COLOURS } from '@/lib/tokens'
import { fontVariables } from './fonts'
import './globals.css'
import { readPreferences } from './preferences'

export const metadata: Metadata = {
  title: { default: 'Steadfold', template: '%s · Steadfold' },
  description: 'Plans the heat and cold an animal will meet between one door and another.',
  icons: { icon: '/icon.svg' },
}

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: COLOURS.day.sheet },
    { media: '(prefers-color-scheme: dark)', color: COLOURS.night.sheet },
  ],
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  const preferences = await readPreferences()
  return (
    <html lang="en-GB" data-theme={preferences.light} className={fontVariables}>
      <body>
        <Providers preferences={preferences}>{children}</Providers>
      </body>
    </html>
  )
}
