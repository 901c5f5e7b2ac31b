import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { queryText } from '@/app/open-page'
import { typedCode } from '@/lib/documents/code'
import { VerifyPage } from './verify-page'

export const metadata: Metadata = { title: 'Check a paper' }
export const dynamic = 'force-dynamic'

export default async function CheckPage({
  searchParams,
}: {
  searchParams: Promise<{ code?: string | string[] }>
}) {
  const typed = queryText((await searchParams).code).slice(0, 20)
  const code = typedCode(typed)
  if (code !== null) redirect(`/verify/${code}`)
  if (typed === '') return <VerifyPage first={{ kind: 'none' }} />
  // It can't be one of ours, so nothing is looked up and no attempt is counted.
  return (
    <VerifyPage
      typed={typed}
      first={{
        kind: 'refused',
        field: 'code',
        message: `“${typed}” is not a code of ours: put eight letters and figures, without I, O, 0 and 1.`,
      }}
    />
  )
}
