'use client'

import { useEffect, useId, useRef } from 'react'
import type { ReactNode } from 'react'
import { Button } from './button'

/** A sheet laid over the page for one decision. The browser keeps the focus inside and gives it back on closing. */
export function Dialog({
  open,
  title,
  onClose,
  children,
  acts,
}: {
  open: boolean
  title: ReactNode
  onClose: () => void
  children: ReactNode
  /** Buttons after "Go back". */
  acts?: ReactNode
}) {
  const dialog = useRef<HTMLDialogElement>(null)
  const titleId = useId()
  useEffect(() => {
    const element = dialog.current
    if (!element) return
    if (open && !element.open) element.showModal()
    if (!open && element.open) element.close()
  }, [open])
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={onClose}
      className="m-auto w-[min(40rem,calc(100vw-2rem))] border-2 border-ink bg-sheet p-0 text-ink backdrop:bg-ground backdrop:opacity-80"
    >
      <div className="px-5 py-4">
        <h2 id={titleId} className="mb-2 text-section">
          {title}
        </h2>
        {children}
        <div className="mt-4 flex flex-wrap gap-2 border-t border-rule pt-3">
          {acts}
          <Button onClick={onClose}>Go back</Button>
        </div>
      </div>
    </dialog>
  )
}
