import type { ReactNode } from 'react'
import { join } from './join'

/**
 * A freight form's head: facts in boxes that share their edges, a caption in each corner. Give the columns as a grid
 * template; below 760 px the boxes stand in two columns, or one where a box asks for it.
 */
export function BoxedFacts({
  children,
  columns = 'repeat(auto-fit, minmax(10rem, 1fr))',
  className,
}: {
  children: ReactNode
  columns?: string
  className?: string
}) {
  return (
    <dl
      style={{ '--columns': columns } as React.CSSProperties}
      className={join(
        'm-0 grid grid-cols-2 overflow-hidden border-2 border-ink bg-sheet desk:grid-cols-(--columns)',
        className,
      )}
    >
      {children}
    </dl>
  )
}

/** One box: caption, then the fact. `whole` spans the row on a phone, `tall` two rows on the desk. */
export function Fact({
  caption,
  children,
  whole = false,
  tall = false,
  className,
}: {
  caption: ReactNode
  children: ReactNode
  whole?: boolean
  tall?: boolean
  className?: string
}) {
  return (
    <div
      className={join(
        // Each box rules its right and its foot; the frame cuts off the ones that would double it.
        '-mb-px -mr-px min-w-0 border-b border-r border-rule px-2.5 pb-1.5 pt-1',
        whole && 'max-desk:col-span-2',
        tall && 'desk:row-span-2',
        className,
      )}
    >
      <dt className="text-caption text-mute">{caption}</dt>
      <dd className="m-0 break-words">{children}</dd>
    </div>
  )
}
