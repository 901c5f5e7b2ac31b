import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import { signingIdentity } from '@/lib/signing'
import type { CertificateView } from '@/lib/views/administration'
import { authorize } from './authorize'
import { deskMoment } from './firm'

/** The certificate that seals papers now. `unavailable` where its key cannot be read. */
export async function loadCertificate(actor: Actor, now: Date): Promise<CertificateView> {
  authorize(actor, 'certificate.write')
  const { subject, issuer, serial, validFromMs, validToMs, selfIssued } = await signingIdentity()
  return {
    subject,
    issuer,
    serial,
    selfIssued,
    validFrom: deskMoment(new Date(validFromMs)),
    validTo: deskMoment(new Date(validToMs)),
    state: now.getTime() < validFromMs ? 'not-yet' : now.getTime() > validToMs ? 'ended' : 'in-force',
  }
}
