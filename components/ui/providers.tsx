'use client'

import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { useState } from 'react'
import type { ReactNode } from 'react'
import type { Preferences } from '@/lib/views/preferences'
import { LiveRegionProvider } from './live-region'
import { PreferencesProvider } from './preferences'

/** What every page may lean on in the browser: cached reads, the unit and light in force, one live region. */
export function Providers({ preferences, children }: { preferences: Preferences; children: ReactNode }) {
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: { queries: { staleTime: 15_000, refetchOnWindowFocus: true, retry: 1 } },
      }),
  )
  return (
    <QueryClientProvider client={client}>
      <PreferencesProvider initial={preferences}>
        <LiveRegionProvider>{children}</LiveRegionProvider>
      </PreferencesProvider>
    </QueryClientProvider>
  )
}
