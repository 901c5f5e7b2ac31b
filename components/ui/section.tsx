import type { ReactNode } from 'react'
import { join } from './join'

/** Title line of a page: name, what it stands at, acts at the right. */
export function PageTitle({
  children,
  words,
  acts,
}: {
  children: ReactNode
  words?: ReactNode
  acts?: ReactNode
}) {
  return (
    <div className="mb-3 flex flex-wrap items-end gap-x-6 gap-y-2">
      <h1 className="text-page">{children}</h1>
      {words && <p className="text-mute">{words}</p>}
      {acts && <div className="ml-auto flex flex-wrap items-center gap-2 no-print">{acts}</div>}
    </div>
  )
}

/** A ruled part of a page: 2 px of ink, its name, a few words, acts at the right. */
export function Section({
  title,
  words,
  acts,
  children,
  id,
  className,
}: {
  title: ReactNode
  words?: ReactNode
  acts?: ReactNode
  children: ReactNode
  id?: string
  className?: string
}) {
  return (
    <section id={id} aria-labelledby={id ? `${id}-title` : undefined} className={join('mt-6', className)}>
      <div className="mb-2 flex flex-wrap items-baseline gap-x-4 gap-y-1 border-t-2 border-ink pt-2">
        <h2 id={id ? `${id}-title` : undefined} className="text-section">
          {title}
        </h2>
        {words && <p className="text-small text-mute max-desk:order-last max-desk:w-full">{words}</p>}
        {acts && <div className="ml-auto flex flex-wrap items-center gap-3 no-print">{acts}</div>}
      </div>
      {children}
    </section>
  )
}

/** A sheet beside a page: ruled parts under one another in one 2 px frame. */
export function Sheet({ children, className }: { children: ReactNode; className?: string }) {
  return (
    <div
      className={join('divide-y divide-rule border-2 border-ink bg-sheet [&>*]:px-4 [&>*]:py-3', className)}
    >
      {children}
    </div>
  )
}

/** What a page is written on: 24 px margins, 16 on a phone. */
export function Page({ children, className }: { children: ReactNode; className?: string }) {
  return (
    <main id="main" tabIndex={-1} className={join('px-6 pb-8 pt-4 outline-none max-desk:px-4', className)}>
      {children}
    </main>
  )
}
