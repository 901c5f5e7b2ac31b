'use client'

import type { ReactNode } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { Page } from '@/components/ui/section'

export interface RouteErrorProps {
  error: Error & { digest?: string }
  reset: () => void
}

/** A page of the desk that failed: what stopped, what still stands, and one way to try again. */
export function RouteError({
  error,
  reset,
  title,
  children,
}: RouteErrorProps & { title: string; children: ReactNode }) {
  return (
    <Page>
      <Notice
        role="alert"
        title={title}
        acts={
          <>
            <Button first onClick={reset}>
              Try it again
            </Button>
            <ButtonLink href="/consignments">To the board</ButtonLink>
          </>
        }
      >
        <p>
          {children}
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
