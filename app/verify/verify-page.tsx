import { PaperCheck } from '@/components/verify/paper-check'
import type { PaperCheckResult } from '@/components/verify/paper-check'
import { Page } from '@/components/ui/section'

/** The public page, with or without something checked already. */
export function VerifyPage({ first, typed }: { first: PaperCheckResult; typed?: string }) {
  return (
    <Page className="mx-auto max-w-[1232px]">
      <h1 className="text-page">Check a paper</h1>
      <p className="mb-4 mt-1 max-w-[70ch] text-long">
        Is the manifest, sheet or label in front of you the one that was issued, and is it still in force? No
        sign-in. This page shows no names, no animals and no route.
      </p>
      <PaperCheck key={typed} first={first} typed={typed} />
      <p className="mt-4 max-w-[80ch] text-small text-mute">
        Does the plan hash shown here begin like the one printed on the paper? If not, the paper was altered:
        keep it, and ring the number printed under “Ring in this order”.
      </p>
    </Page>
  )
}
