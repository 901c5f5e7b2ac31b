'use client'

import { signOut } from 'next-auth/react'

/** Ends the session and returns to the sign-in page. */
export function SignOutButton() {
  return (
    <button
      type="button"
      className="link touch text-small"
      onClick={() => void signOut({ callbackUrl: '/sign-in' })}
    >
      Sign out
    </button>
  )
}
