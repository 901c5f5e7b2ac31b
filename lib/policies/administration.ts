import { line } from './table'
import type { NoFacts } from './table'

/** The firm's own records. The catalogue of species is read by those who plan and judge. */
export const administrationPolicy = {
  'user.list': line<NoFacts>({ admin: true }),
  'species.read': line<NoFacts>({ admin: true, dispatcher: true, vet: true }),
  'certificate.write': line<NoFacts>({ admin: true }),
  'mail.list': line<NoFacts>({ admin: true }),
  'mail.resend': line<NoFacts>({ admin: true }),
  'audit.list': line<NoFacts>({ admin: true }),
}
