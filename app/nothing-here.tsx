import Link from 'next/link'
import { buttonClass } from '@/components/ui/button'
import { Page } from '@/components/ui/section'

/** Under the head of a group of pages: what is not there, or not this person's. */
export default function NothingHere() {
  return (
    <Page>
      <h1 className="text-page">Nothing stands at this address</h1>
      <p className="mt-2 max-w-[60ch] text-long">
        It may have been typed wrongly, or it belongs to somebody else. Nothing was changed.
      </p>
      <p className="mt-4">
        <Link href="/" className={buttonClass({ first: true })}>
          To the first page
        </Link>
      </p>
    </Page>
  )
}
