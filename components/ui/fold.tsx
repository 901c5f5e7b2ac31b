import type { ReactNode } from 'react'
import { Attention } from './notice'

/** Parts of a plan folded to one line each: name, what it holds, the link that opens it. */
export function Folds({ children }: { children: ReactNode }) {
  return <div className="divide-y divide-ink border-y-2 border-ink bg-sheet">{children}</div>
}

export function Fold({
  name,
  children,
  act,
  error,
}: {
  name: ReactNode
  children: ReactNode
  act?: ReactNode
  /** What has to be put right, as a sentence. */
  error?: ReactNode
}) {
  return (
    <div className="grid grid-cols-[1fr_auto] items-start gap-x-3 px-3 py-[7px] max-desk:items-center desk:grid-cols-[104px_1fr_auto]">
      <h3 className="text-sub">{name}</h3>
      <div className="max-desk:order-last max-desk:col-span-2">
        {children}
        {error && <Attention>{error}</Attention>}
      </div>
      {act}
    </div>
  )
}
