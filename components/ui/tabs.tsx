import Link from 'next/link'
import type { ReactNode } from 'react'
import { join } from './join'

export interface TabItem {
  href: string
  /** Crate letter, stencilled. */
  letter?: string
  name: ReactNode
  words?: ReactNode
  stamp?: ReactNode
}

/** Animals or crates side by side, joined to the part below. Links, so that each has an address of its own. */
export function Tabs({
  items,
  current,
  label,
}: {
  items: readonly TabItem[]
  current: string
  label: string
}) {
  return (
    <nav aria-label={label} className="flex border-b-2 border-ink desk:gap-1.5">
      {items.map((item) => {
        const chosen = item.href === current
        return (
          <Link
            key={item.href}
            href={item.href}
            scroll={false}
            aria-current={chosen ? 'true' : undefined}
            className={join(
              'flex min-h-12 items-center gap-x-2.5 px-3.5 py-[7px] text-ink no-underline max-desk:flex-1 max-desk:justify-center max-desk:px-2',
              // The chosen tab is open to the part below: its foot covers the rule.
              chosen
                ? '-mb-0.5 border-2 border-ink border-b-ground bg-ground max-desk:font-semibold'
                : 'border border-b-0 border-rule bg-band',
            )}
          >
            {item.letter && <span className="crate text-[1.5rem] leading-7">{item.letter}</span>}
            <span className="min-w-0">
              <span className="block desk:font-semibold">{item.name}</span>
              {item.words && <span className="block text-small text-mute max-desk:hidden">{item.words}</span>}
            </span>
            {item.stamp && <span className="ml-3.5 max-desk:hidden">{item.stamp}</span>}
          </Link>
        )
      })}
    </nav>
  )
}

/** Pages of one part, as words over a rule: Users, Shippers, Mail queue. */
export function SubPages({
  items,
  current,
  label,
}: {
  items: readonly { href: string; words: ReactNode }[]
  current: string
  label: string
}) {
  return (
    <nav aria-label={label} className="mb-3 flex flex-wrap gap-x-6 border-b border-rule">
      {items.map((item) => (
        <Link
          key={item.href}
          href={item.href}
          aria-current={item.href === current ? 'page' : undefined}
          className="flex min-h-9 items-center border-b-4 border-transparent pt-1 text-ink no-underline hover:underline aria-[current]:border-ink aria-[current]:font-semibold max-desk:min-h-11"
        >
          {item.words}
        </Link>
      ))}
    </nav>
  )
}

/** Keyset paging: says what stands on the page and what comes next by name, never by page number. */
export function Paging({
  words,
  before,
  after,
}: {
  words: ReactNode
  before?: ReactNode
  after?: ReactNode
}) {
  return (
    <div className="mt-2 flex flex-wrap items-center gap-2">
      <p className="mr-auto text-mute">{words}</p>
      {before}
      {after}
    </div>
  )
}
