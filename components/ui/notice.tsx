import type { ReactNode } from 'react'
import { join } from './join'

/** A stopped run, a refused save, a conflict: ink frame with a double rule on the left. Says what stopped and what still stands. */
export function Notice({
  title,
  children,
  acts,
  role,
  className,
}: {
  title?: ReactNode
  children?: ReactNode
  acts?: ReactNode
  role?: 'alert' | 'status'
  className?: string
}) {
  return (
    <div
      role={role}
      className={join('dbl border-y-2 border-r-2 border-y-ink border-r-ink bg-sheet px-4 py-3', className)}
    >
      {title && <h2 className="mb-1 text-sub">{title}</h2>}
      {children}
      {acts && <div className="mt-2 flex flex-wrap gap-3">{acts}</div>}
    </div>
  )
}

/** One sentence with the double rule: it waits to be put right. Stands under a field or in a cell. */
export function Attention({ children, id }: { children: ReactNode; id?: string }) {
  return (
    <span id={id} className="dbl block pl-2 text-small font-semibold">
      {children}
    </span>
  )
}

/** Nothing here yet: one sentence of fact and one button. */
export function Empty({ children, act }: { children: ReactNode; act?: ReactNode }) {
  return (
    <div className="border border-rule bg-sheet px-4 py-4">
      <p className="text-body">{children}</p>
      {act && <div className="mt-3">{act}</div>}
    </div>
  )
}
