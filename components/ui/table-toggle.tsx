'use client'

import { useState } from 'react'
import type { ReactNode } from 'react'

/** A picture and its table twin: the same figures, one or the other, by a link that says which. */
export function TableToggle({
  title,
  words,
  picture,
  table,
  acts,
}: {
  title: ReactNode
  words?: ReactNode
  picture: ReactNode
  table: ReactNode
  acts?: ReactNode
}) {
  const [asTable, setAsTable] = useState(false)
  return (
    <>
      <div className="mb-2.5 flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <h2 className="text-section">{title}</h2>
        {words && <p className="text-small text-mute max-desk:order-last max-desk:w-full">{words}</p>}
        <div className="ml-auto flex items-center gap-4 no-print">
          {acts}
          <button
            type="button"
            className="link max-desk:min-h-11"
            onClick={() => setAsTable((before) => !before)}
          >
            {asTable ? 'Show as picture' : 'Show as table'}
          </button>
        </div>
      </div>
      {asTable ? table : picture}
    </>
  )
}
