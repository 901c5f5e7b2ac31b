'use client'

import { fontVariables } from './fonts'
import './globals.css'

/** The last page that can still be drawn: the layout itself failed, so it stands without head and providers. */
export default function GlobalError({
  error,
  reset,
}: {
  error: Error & { digest?: string }
  reset: () => void
}) {
  return (
    <html lang="en-GB" data-theme="system" className={fontVariables}>
      <body className="px-6 py-4">
        <div className="dbl max-w-[60ch] border-y-2 border-r-2 border-y-ink border-r-ink bg-sheet px-4 py-3">
          <h1 className="text-page">Steadfold stopped</h1>
          <p className="mt-2 text-long">
            What was saved before still stands. If animals are on the way, work from the paper and ring the
            desk.
            {error.digest && ` The fault is kept under ${error.digest}.`}
          </p>
          <button
            type="button"
            onClick={reset}
            className="mt-3 min-h-11 cursor-pointer border border-hand bg-hand-fill px-4 font-semibold text-on-hand"
          >
            Try it again
          </button>
        </div>
      </body>
    </html>
  )
}
