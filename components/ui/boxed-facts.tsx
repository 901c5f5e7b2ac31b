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
        // The outer rule is the frame; inner rules are drawn as gaps of the grid, so that no box has a double edge.
        'm-0 grid grid-cols-2 gap-px overflow-hidden border-2 border-ink bg-rule desk:grid-cols-(--columns)',
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
        'min-w-0 bg-sheet px-2.5 pb-1.5 pt-1',
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
