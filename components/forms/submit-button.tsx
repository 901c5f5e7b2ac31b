'use client'

import type { ReactNode } from 'react'
import { Button } from '@/components/ui/button'

/** Sends its form. While it is under way the words say so; nothing spins, and it can't be pressed twice. */
export function SubmitButton({
  pending,
  children,
  pendingWords = 'Sending',
  refused,
  size,
  first = true,
  name,
  value,
}: {
  pending: boolean
  children: ReactNode
  pendingWords?: string
  /** What is still missing; stands under the button too. */
  refused?: string
  size?: 'desk' | 'phone'
  first?: boolean
  name?: string
  value?: string
}) {
  return (
    <span className="inline-flex flex-col items-start gap-1.5">
      <Button
        type="submit"
        first={first}
        size={size}
        name={name}
        value={value}
        refused={pending ? pendingWords : refused}
        aria-busy={pending || undefined}
      >
        {pending ? pendingWords : children}
      </Button>
      {refused && <span className="text-small">{refused}</span>}
    </span>
  )
}
