import type { ReactNode } from 'react'
import { Button } from '@/components/ui/button'

/** A list's questions, asked by address: works without a script, and the answer can be kept as a link. */
export function FilterBar({
  action,
  children,
  words = 'Show',
}: {
  action: string
  children: ReactNode
  words?: string
}) {
  return (
    <form
      action={action}
      method="get"
      role="search"
      className="mb-3 flex flex-wrap items-end gap-x-4 gap-y-2"
    >
      {children}
      <Button type="submit">{words}</Button>
    </form>
  )
}
