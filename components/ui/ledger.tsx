import type { ComponentProps, ReactNode } from 'react'
import { join } from './join'

/**
 * A table ruled as a ledger: ink above and below, column hairlines. The caption is for ears unless `shown`.
 * Wrapped, so that a wide table scrolls inside its page and not the page itself. One that `folds` needs no scrolling on a
 * phone: each row stands as a block, each cell on its own line behind its `label`.
 */
export function Ledger({
  caption,
  shown = false,
  folds = false,
  children,
  className,
  ...rest
}: { caption: ReactNode; shown?: boolean; folds?: boolean } & ComponentProps<'table'>) {
  return (
    // Focusable, so that the arrow keys scroll what does not fit.
    <div
      role="group"
      tabIndex={0}
      aria-label={typeof caption === 'string' ? caption : 'Table'}
      className="relative overflow-x-auto print:overflow-visible"
    >
      <table
        {...rest}
        className={join(
          // Many columns on a phone: the table scrolls in its part rather than stand one word wide.
          folds ? 'folds' : 'max-desk:has-[th:nth-child(5)]:min-w-[56rem]',
          'w-full print:!min-w-0 border-collapse border-y-2 border-ink bg-sheet [&_td+td]:border-l [&_td+td]:border-l-hair [&_td+th]:border-l [&_td+th]:border-l-hair [&_th+td]:border-l [&_th+td]:border-l-hair [&_th+th]:border-l [&_th+th]:border-l-hair',
          className,
        )}
      >
        <caption className={shown ? 'caption-bottom pt-1.5 text-left text-small text-mute' : 'sr-only'}>
          {caption}
        </caption>
        {children}
      </table>
    </div>
  )
}

/** A head cell. The unit stands here or in the cells, never in both. */
export function Head({
  numeric = false,
  className,
  scope = 'col',
  ...rest
}: { numeric?: boolean } & ComponentProps<'th'>) {
  return (
    <th
      scope={scope}
      {...rest}
      className={join(
        'border-b border-ink bg-sheet px-2.5 py-[5px] align-bottom text-caption font-semibold text-mute',
        numeric ? 'text-right' : 'text-left',
        className,
      )}
    />
  )
}

/**
 * A body cell; `numeric` sets figures right in Mono; `attention` is the double rule of something to be put right; `label`
 * names the cell where its table is folded, and `inline` cells share a line there.
 */
export function Cell({
  numeric = false,
  attention = false,
  label,
  inline = false,
  className,
  ...rest
}: { numeric?: boolean; attention?: boolean; label?: string; inline?: boolean } & ComponentProps<'td'>) {
  return (
    <td
      data-label={label}
      data-inline={inline || undefined}
      {...rest}
      className={join(
        'border-t border-hair px-2.5 py-[7px] align-middle',
        numeric && 'fig whitespace-nowrap text-right text-small',
        attention && 'dbl',
        className,
      )}
    />
  )
}

/** The cell that names its row. */
export function RowHead({
  attention = false,
  inline = false,
  className,
  ...rest
}: { attention?: boolean; inline?: boolean } & ComponentProps<'th'>) {
  return (
    <th
      scope="row"
      data-inline={inline || undefined}
      {...rest}
      className={join(
        'border-t border-hair px-2.5 py-[7px] text-left align-middle font-normal',
        attention && 'dbl',
        className,
      )}
    />
  )
}

/** A row; the chosen one is washed violet with a violet edge. */
export function Row({ chosen = false, className, ...rest }: { chosen?: boolean } & ComponentProps<'tr'>) {
  return (
    <tr
      aria-selected={chosen || undefined}
      {...rest}
      className={join(
        chosen && 'bg-handwash [&>*:first-child]:shadow-[inset_4px_0_0_var(--hand)]',
        className,
      )}
    />
  )
}

/** "Leaves today, 4": a band across the table, above the rows it heads. */
export function GroupRow({ children, columns }: { children: ReactNode; columns: number }) {
  return (
    <tr>
      <th
        scope="colgroup"
        colSpan={columns}
        className="border-b border-t border-b-rule border-t-ink bg-band px-2.5 py-1 text-left font-head text-body font-bold"
      >
        {children}
      </th>
    </tr>
  )
}

/** Two lines in a cell: the fact, and smaller under it what belongs to it. */
export function Lines({
  first,
  second,
  strong = false,
}: {
  first: ReactNode
  second?: ReactNode
  strong?: boolean
}) {
  return (
    <>
      <span className={join('block', strong && 'font-semibold')}>{first}</span>
      {second && <span className="block text-small text-mute">{second}</span>}
    </>
  )
}
