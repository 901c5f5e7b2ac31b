import type { ReactNode } from 'react'
import { join } from './join'

/** Names and facts in two columns, ruled by hairlines. */
export function Pairs({
  children,
  ruled = true,
  wide = false,
}: {
  children: ReactNode
  ruled?: boolean
  wide?: boolean
}) {
  return (
    <dl
      className={join(
        'm-0',
        ruled && 'border-y-2 border-ink divide-y divide-hair',
        wide ? '[--name:11rem]' : '[--name:8rem]',
      )}
    >
      {children}
    </dl>
  )
}

export function Pair({ name, children }: { name: ReactNode; children: ReactNode }) {
  return (
    <div className="grid gap-x-4 py-1.5 desk:grid-cols-[var(--name)_1fr]">
      <dt className="text-mute">{name}</dt>
      <dd className="m-0 break-words">{children}</dd>
    </div>
  )
}

/** Who signed: violet italic, because it is the hand. */
export function Signature({ children }: { children: ReactNode }) {
  return (
    <span className="whitespace-nowrap font-head text-signature font-semibold italic text-hand">
      {children}
    </span>
  )
}
