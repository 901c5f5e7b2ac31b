import type { Metadata } from 'next'
import Link from 'next/link'
import { redirect } from 'next/navigation'
import { CrateSide } from '@/components/ui/crate-side'
import { currentActor } from '@/lib/auth/actor'
import { demoAccounts } from '@/lib/auth/demo-accounts'
import { env } from '@/lib/env'
import { HOME } from '@/lib/policies/routes'
import { SignInLabel } from './sign-in-label'

export const metadata: Metadata = { title: 'Sign in' }
export const dynamic = 'force-dynamic'

/** The one door. Whoever is signed in already goes where they were going. */
export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const returnTo = ownAddress((await searchParams)['to'])
  const actor = await currentActor()
  if (actor !== null) redirect(returnTo ?? HOME[actor.role])
  const { firm } = env()
  return (
    <>
      <main>
        <CrateSide firm={firm.name} line="Heat and cold on the way, leg by leg, door to door.">
          <SignInLabel
            returnTo={returnTo ?? '/'}
            deskTelephone={firm.telephone}
            demo={await demoAccounts()}
          />
        </CrateSide>
      </main>
      <p className="px-4 py-3.5 text-mute desk:px-6">
        <Link href="/verify">Check a paper</Link> needs no sign-in. No account yet? One comes by invitation
        from your dispatcher’s office.
      </p>
    </>
  )
}

/** Only an address of ours: a link to the sign-in page must not send people elsewhere afterwards. */
function ownAddress(to: string | string[] | undefined): string | null {
  const address = Array.isArray(to) ? to[0] : to
  if (address === undefined || !/^\/(?![/\\])/.test(address)) return null
  return address
}
