'use client'

import { signIn } from 'next-auth/react'
import { useEffect, useState } from 'react'
import { PasswordInput, TextInput } from '@/components/forms/text-input'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { readRefusal } from '@/lib/auth/refusal-word'
import type { SignInRefusal } from '@/lib/auth/refusal-word'
import { signInSchema } from '@/lib/schemas/sign-in'
import { clock, zoneWithOffset } from '@/lib/views/format'

interface Typed {
  email: string
  password: string
}

/** Address and password. What was typed as an address stays; a wrong password is put again. */
export function SignInForm({
  typed,
  setTyped,
  returnTo,
  deskTelephone,
}: {
  typed: Typed
  setTyped: (typed: Typed) => void
  returnTo: string
  deskTelephone: string
}) {
  const [errors, setErrors] = useState<Partial<Typed>>({})
  const [refusal, setRefusal] = useState<SignInRefusal | null>(null)
  const [pending, setPending] = useState(false)
  const closedForS = useSecondsUntil(refusal?.kind === 'closed' ? refusal.untilMs : null)
  const closed = refusal?.kind === 'closed' && closedForS > 0

  async function send(event: React.FormEvent) {
    event.preventDefault()
    if (pending || closed) return
    const parsed = signInSchema.safeParse(typed)
    setErrors(parsed.success ? {} : firstMessages(parsed.error.issues))
    if (!parsed.success) return setRefusal(null)
    setPending(true)
    const answer = await ask(parsed.data)
    if (answer === null) return window.location.assign(returnTo)
    setPending(false)
    setRefusal(answer)
    setTyped({ ...typed, password: '' })
    if (answer.kind === 'refused') setErrors({ password: 'Put the password again. The address was kept.' })
    document.getElementById('sign-in-password')?.focus()
  }

  return (
    <form method="post" noValidate onSubmit={send} aria-labelledby="sign-in-title">
      <h1 id="sign-in-title" className="text-page">
        Sign in
      </h1>
      {refusal && (closed || refusal.kind !== 'closed') && (
        <div className="mt-3">
          <RefusalNotice refusal={refusal} closedForS={closedForS} deskTelephone={deskTelephone} />
        </div>
      )}
      <TextInput
        id="sign-in-email"
        className="mt-3.5"
        label="E-mail address"
        type="email"
        name="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        required
        value={typed.email}
        onChange={(event) => setTyped({ ...typed, email: event.target.value })}
        error={errors.email}
      />
      <PasswordInput
        id="sign-in-password"
        className="mt-3.5"
        label="Password"
        name="password"
        required
        value={typed.password}
        onChange={(event) => setTyped({ ...typed, password: event.target.value })}
        error={errors.password}
      />
      <div className="mt-[18px] flex flex-wrap items-center justify-between gap-4">
        <Button
          type="submit"
          first
          disabled={pending}
          refused={closed ? 'This address is closed for the moment.' : undefined}
          className="min-h-11 px-[22px] text-long max-desk:w-full"
        >
          {pending ? 'Signing in …' : 'Sign in'}
        </Button>
        <p className="text-small text-mute">
          Forgotten password: ring the desk, <span className="whitespace-nowrap">{deskTelephone}</span>
        </p>
      </div>
    </form>
  )
}

function RefusalNotice({
  refusal,
  closedForS,
  deskTelephone,
}: {
  refusal: SignInRefusal
  closedForS: number
  deskTelephone: string
}) {
  switch (refusal.kind) {
    case 'refused':
      return (
        <Notice role="alert" title="Wrong password">
          Address and password don’t belong together. {refusal.triesLeft}{' '}
          {refusal.triesLeft === 1 ? 'try' : 'tries'} left before a wait of 5 min.
        </Notice>
      )
    case 'closed': {
      const zone = Intl.DateTimeFormat().resolvedOptions().timeZone
      return (
        <Notice role="alert" title="Too many tries">
          <p>6 wrong passwords for this address. You can try again in</p>
          <p className="fig text-big font-semibold" aria-live="off">
            {Math.floor(closedForS / 60)}:{String(closedForS % 60).padStart(2, '0')}
          </p>
          <p>
            at {clock(refusal.untilMs, zone)} {zoneWithOffset(refusal.untilMs, zone)}. Other people can sign
            in meanwhile. Not you? Tell the desk, {deskTelephone}.
          </p>
        </Notice>
      )
    }
    case 'fault':
      return (
        <Notice role="alert" title="Not signed in">
          The server gave no answer that can be used. Try again; if it stays so, ring the desk,{' '}
          {deskTelephone}.
        </Notice>
      )
  }
}

/** null: signed in. */
async function ask({ email, password }: Typed): Promise<SignInRefusal | null> {
  try {
    const answer = await signIn('credentials', { email, password, redirect: false })
    if (answer?.ok && !answer.error) return null
    return readRefusal(answer?.error ?? '')
  } catch {
    return { kind: 'fault' }
  }
}

function useSecondsUntil(untilMs: number | null): number {
  const [leftS, setLeftS] = useState(0)
  useEffect(() => {
    if (untilMs === null) return
    const tick = () => setLeftS(Math.max(0, Math.ceil((untilMs - Date.now()) / 1000)))
    tick()
    const timer = setInterval(tick, 1000)
    return () => clearInterval(timer)
  }, [untilMs])
  return leftS
}

function firstMessages(issues: readonly { path: PropertyKey[]; message: string }[]): Partial<Typed> {
  const messages: Partial<Typed> = {}
  for (const { path, message } of issues) {
    const field = path[0]
    if (field === 'email' || field === 'password') messages[field] ??= message
  }
  return messages
}
