'use client'

import { useState } from 'react'
import { LabelPart } from '@/components/ui/crate-side'
import { SignInForm } from './sign-in-form'

export interface DemoAccountsView {
  password: string
  people: { role: string; name: string; email: string }[]
}

/** The label on the crate: the form, and on a demo installation the people one may sign in as. */
export function SignInLabel({
  returnTo,
  deskTelephone,
  demo,
}: {
  returnTo: string
  deskTelephone: string
  demo: DemoAccountsView | null
}) {
  const [typed, setTyped] = useState({ email: '', password: '' })
  return (
    <>
      <LabelPart>
        <SignInForm {...{ typed, setTyped, returnTo, deskTelephone }} />
      </LabelPart>
      {demo && (
        <LabelPart>
          <DemoAccounts demo={demo} onFill={(email) => setTyped({ email, password: demo.password })} />
        </LabelPart>
      )}
    </>
  )
}

function DemoAccounts({ demo, onFill }: { demo: DemoAccountsView; onFill: (email: string) => void }) {
  return (
    <section aria-labelledby="demo-accounts">
      <p id="demo-accounts">
        Demo installation, invented animals only. Password for all {demo.people.length}:{' '}
        <b className="fig whitespace-nowrap">{demo.password}</b>
      </p>
      <ul className="mt-1.5 list-none desk:max-h-40 desk:overflow-y-auto">
        {demo.people.map(({ email, role, name }) => (
          <li key={email} className="flex items-center justify-between gap-3 border-t border-hair py-[3px]">
            <span>
              {email} <span className="text-mute">{role}</span>
            </span>
            <button
              type="button"
              className="link whitespace-nowrap max-desk:min-h-11"
              onClick={() => onFill(email)}
            >
              Fill in<span className="sr-only"> {name}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  )
}
