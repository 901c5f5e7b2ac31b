import type { Metadata } from 'next'
import { openPage } from '@/app/open-page'
import { AdminPages } from '@/components/admin/admin-pages'
import { CertificateFacts } from '@/components/admin/certificate-facts'
import { Notice } from '@/components/ui/notice'
import { Page, PageTitle } from '@/components/ui/section'
import { loadCertificate } from '@/lib/domain/certificate'
import { isSteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { CertificateView } from '@/lib/views/administration'

export const metadata: Metadata = { title: 'Certificate' }
export const dynamic = 'force-dynamic'

export default async function CertificatePage() {
  const actor = await openPage('/admin/certificate', '/admin/certificate')
  const certificate = await readCertificate(actor)
  return (
    <Page>
      <PageTitle words="what seals manifests and go/no-go sheets">Certificate</PageTitle>
      <AdminPages current="/admin/certificate" />
      {typeof certificate === 'string' ? (
        <Notice title="No paper can be sealed">{certificate}</Notice>
      ) : (
        <CertificateFacts view={certificate} />
      )}
    </Page>
  )
}

/** The certificate, or in words why its key can't be read. */
async function readCertificate(actor: Actor): Promise<CertificateView | string> {
  try {
    return await loadCertificate(actor, new Date())
  } catch (error) {
    if (isSteadfoldError(error) && error.code === 'unavailable') return error.message
    throw error
  }
}
