import type { Metadata } from 'next'
import { headers } from 'next/headers'
import type { PaperCheckResult } from '@/components/verify/paper-check'
import { requestIp } from '@/lib/auth/request-ip'
import { printedCode, typedCode } from '@/lib/documents/code'
import { verifyCode } from '@/lib/domain/documents/verify'
import { isSteadfoldError } from '@/lib/errors'
import { refusedCheck } from '../refused-check'
import { VerifyPage } from '../verify-page'

export const metadata: Metadata = { title: 'Check a paper', robots: { index: false } }
export const dynamic = 'force-dynamic'

export default async function CodePage({ params }: { params: Promise<{ code: string }> }) {
  const typed = (await params).code.slice(0, 20)
  const code = typedCode(typed)
  return <VerifyPage typed={code ? printedCode(code) : typed} first={await check(typed)} />
}

async function check(code: string): Promise<PaperCheckResult> {
  const now = new Date()
  try {
    return { kind: 'checked', view: await verifyCode({ ip: requestIp(await headers()) }, { code }, now) }
  } catch (error) {
    if (isSteadfoldError(error)) return refusedCheck(error, 'code', now)
    throw error
  }
}
