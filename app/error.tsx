'use client'

import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { Page } from '@/components/ui/section'

export default function PageError({
  error,
  reset,
}: {
  error: Error & { digest?: string }
  reset: () => void
}) {
  return (
    <Page>
      <Notice
        role="alert"
        title="This page stopped"
        acts={
          <Button first onClick={reset}>
            Try it again
          </Button>
        }
      >
        <p className="max-w-[60ch] text-long">
          Nothing was changed by it, and what was saved before still stands.
          {error.digest && (
            <>
              {' '}
              The fault is kept under <span className="fig">{error.digest}</span>.
            </>
          )}
        </p>
      </Notice>
    </Page>
  )
}
