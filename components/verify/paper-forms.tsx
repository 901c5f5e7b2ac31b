'use client'

import { useRef, useState } from 'react'
import { Button } from '@/components/ui/button'
import { Attention } from '@/components/ui/notice'
import { MAX_VERIFY_BYTES } from '@/lib/schemas/verify'
import type { PaperCheckResult } from './paper-check'

/** The two ways to check a paper. The code goes by the address bar, so that it works without a script and can be kept. */
export function PaperForms({
  typed,
  refused,
  onResult,
}: {
  typed: string
  refused: Extract<PaperCheckResult, { kind: 'refused' }> | null
  onResult: (result: PaperCheckResult) => void
}) {
  const codeError = refused?.field === 'code' ? refused.message : undefined
  return (
    <>
      <form action="/verify" method="get">
        <label htmlFor="code" className="font-semibold">
          Document code
        </label>
        <p id="code-hint" className="text-small text-mute">
          Eight characters, beside the square on every sheet. Letters I and O are never used.
        </p>
        <div className="mt-1 flex flex-wrap gap-2">
          <span
            className={
              codeError
                ? 'dbl flex min-w-0 flex-[1_1_12rem] border-y-2 border-r-2 border-y-ink border-r-ink'
                : 'flex min-w-0 flex-[1_1_12rem] border border-b-2 border-rule border-b-hand'
            }
          >
            <input
              id="code"
              name="code"
              defaultValue={typed}
              maxLength={20}
              autoComplete="off"
              autoCapitalize="characters"
              spellCheck={false}
              required
              aria-describedby={codeError ? 'code-hint code-error' : 'code-hint'}
              aria-invalid={codeError ? true : undefined}
              className="fig h-[52px] w-full min-w-0 bg-transparent px-3 text-mark-m font-semibold uppercase text-ink"
            />
          </span>
          <Button type="submit" first size="phone" className="max-desk:w-full">
            Check this code
          </Button>
        </div>
        {codeError && <Attention id="code-error">{codeError}</Attention>}
      </form>
      <p className="my-5 flex items-center gap-4 text-mute before:h-px before:flex-1 before:bg-rule after:h-px after:flex-1 after:bg-rule">
        or
      </p>
      <FileCheck error={refused?.field === 'file' ? refused.message : undefined} onResult={onResult} />
      <p className="mt-4 text-small text-mute">
        20 checks in 10 min from one place. After that the page says how long to wait.
      </p>
    </>
  )
}

function FileCheck({
  error,
  onResult,
}: {
  error: string | undefined
  onResult: (result: PaperCheckResult) => void
}) {
  const input = useRef<HTMLInputElement>(null)
  const [at, setAt] = useState<'ready' | 'over' | 'sending'>('ready')

  async function check(file: File | undefined) {
    if (!file) return
    setAt('sending')
    onResult(await sendFile(file))
    setAt('ready')
    if (input.current) input.current.value = ''
  }

  return (
    <div
      onDragOver={(event) => {
        event.preventDefault()
        setAt('over')
      }}
      onDragLeave={() => setAt('ready')}
      onDrop={(event) => {
        event.preventDefault()
        void check(event.dataTransfer.files[0])
      }}
      className={`border border-b-2 border-rule border-b-hand p-4 ${at === 'over' ? 'bg-handwash' : ''}`}
    >
      <div className="flex flex-wrap items-center gap-x-4 gap-y-3">
        <input
          ref={input}
          id="paper"
          type="file"
          accept="application/pdf,.pdf"
          tabIndex={-1}
          aria-hidden="true"
          className="sr-only"
          onChange={(event) => void check(event.target.files?.[0])}
        />
        <Button
          className="max-desk:w-full"
          aria-describedby={error ? 'paper-hint paper-error' : 'paper-hint'}
          aria-busy={at === 'sending' || undefined}
          onClick={() => input.current?.click()}
        >
          {at === 'sending' ? 'Comparing' : 'Choose the PDF'}
        </Button>
        <span id="paper-hint" className="flex-[1_1_12rem] text-mute">
          or drop it here. {MAX_VERIFY_BYTES / 1024 / 1024} MB at most. The file is compared, then thrown
          away; it is not kept.
        </span>
      </div>
      {error && (
        <div className="mt-2" role="alert">
          <Attention id="paper-error">{error}</Attention>
        </div>
      )}
    </div>
  )
}

/** Sends the bytes as they are. What can be seen here already is refused here, so that 200 MB never leave a telephone. */
async function sendFile(file: File): Promise<PaperCheckResult> {
  const refused = (message: string): PaperCheckResult => ({ kind: 'refused', field: 'file', message })
  if (file.size > MAX_VERIFY_BYTES) {
    const mb = Math.ceil(file.size / 1024 / 1024)
    return refused(
      `“${file.name}” has ${mb} MB: choose a PDF of at most ${MAX_VERIFY_BYTES / 1024 / 1024} MB.`,
    )
  }
  if (file.size === 0) return refused(`“${file.name}” is empty: choose the PDF as you received it.`)
  try {
    const response = await fetch('/api/verify', {
      method: 'POST',
      headers: { 'content-type': 'application/pdf' },
      body: file,
    })
    return (await response.json()) as PaperCheckResult
  } catch {
    return refused('The file did not reach us: check the connection, then choose it again.')
  }
}
