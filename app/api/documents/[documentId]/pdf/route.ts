import { downloadDocument } from '@/lib/domain/documents/download'
import { bytesRoute, idOf } from '@/lib/route'

export const dynamic = 'force-dynamic'

/** A paper as issued, to the byte. Who may not read it finds nothing; each download is in the audit trail. */
export const GET = bytesRoute('/api/documents/[documentId]/pdf', async ({ actor, params, now }) => {
  const { bytes, fileName } = await downloadDocument(actor, { documentId: idOf(params, 'documentId') }, now)
  return { bytes, fileName, type: 'application/pdf' }
})
