'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { join } from './join'
import type { NavLink } from './navigation'

/** Links of a head or a sub-head; the page in view has a foot of ink and weight 600. */
export function NavLinks({
  links,
  label,
  stacked = false,
  inRow = false,
}: {
  links: readonly NavLink[]
  label: string
  /** Under one another, in the menu of a narrow head. */
  stacked?: boolean
  /** Side by side over the whole width of a narrow head. */
  inRow?: boolean
}) {
  const path = usePathname()
  const current = longest(links, path)
  return (
    <nav
      aria-label={label}
      className={
        inRow
          ? 'flex divide-x divide-rule border-b-2 border-ink bg-sheet board:hidden'
          : stacked
            ? 'flex flex-col'
            : 'flex items-stretch gap-1'
      }
    >
      {links.map((link) => (
        <Link
          key={link.href}
          href={link.href}
          aria-current={link.href === current ? 'page' : undefined}
          className={join(
            'relative flex items-center text-ink no-underline decoration-hand hover:underline aria-[current]:font-semibold',
            inRow
              ? "min-h-12 flex-1 justify-center px-2 text-center aria-[current]:after:absolute aria-[current]:after:inset-x-0 aria-[current]:after:bottom-0 aria-[current]:after:h-1.5 aria-[current]:after:bg-ink aria-[current]:after:content-['']"
              : stacked
                ? 'min-h-12 border-t border-hair px-4 text-phone aria-[current]:border-l-[4px] aria-[current]:border-l-ink'
                : "px-2.5 aria-[current]:after:absolute aria-[current]:after:inset-x-2.5 aria-[current]:after:bottom-0 aria-[current]:after:h-1 aria-[current]:after:bg-ink aria-[current]:after:content-['']",
          )}
        >
          {link.words}
        </Link>
      ))}
    </nav>
  )
}

/** The longest link the path lies under, so that /portal/documents doesn't also mark /portal. */
function longest(links: readonly NavLink[], path: string): string | undefined {
  return links
    .filter((link) => path === link.href || path.startsWith(`${link.href}/`))
    .sort((a, b) => b.href.length - a.href.length)[0]?.href
}
