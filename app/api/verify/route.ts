import { SteadfoldError, isSteadfoldError } from '@/lib/errors'
import { verifyFile } from '@/lib/domain/documents/verify'
import { publicRoute } from '@/lib/route'
import { MAX_VERIFY_BYTES } from '@/lib/schemas/verify'
import type { PaperCheckResult } from '@/components/verify/paper-check'
import { refusedCheck } from '@/app/verify/refused-check'

export const dynamic = 'force-dynamic'

/** Compares an uploaded paper with what was issued. The bytes are the body; they are never kept. */
export const POST = publicRoute(async ({ request, ip, now }): Promise<PaperCheckResult> => {
  try {
    const bytes = await bodyWithin(request, MAX_VERIFY_BYTES)
    return { kind: 'checked', view: await verifyFile({ ip }, bytes, now) }
  } catch (error) {
    if (isSteadfoldError(error)) return refusedCheck(error, 'file', now)
    throw error
  }
})

/** The body, read no further than it may be long: what a header claims is nothing to rely on. */
async function bodyWithin(request: Request, most: number): Promise<Uint8Array> {
  const chunks: Uint8Array[] = []
  let length = 0
  const reader = request.body?.getReader()
  for (let part = await reader?.read(); part && !part.done; part = await reader?.read()) {
    length += part.value.byteLength
    if (length > most) {
      await reader?.cancel()
      throw new SteadfoldError(
        'invalid',
        `This file is larger than ${most / 1024 / 1024} MB: no paper of ours is.`,
      )
    }
    chunks.push(part.value)
  }
  return Buffer.concat(chunks)
}
