import { line } from './table'
import type { NoFacts } from './table'

/** The firm's own records. Catalogues are read by those who plan and judge, and written by an admin. */
export const administrationPolicy = {
  'user.list': line<NoFacts>({ admin: true }),
  'user.write': line<NoFacts>({ admin: true }),
  'shipper.list': line<NoFacts>({ admin: true, dispatcher: true }),
  'shipper.write': line<NoFacts>({ admin: true }),
  'place.list': line<NoFacts>({ admin: true, dispatcher: true, vet: true }),
  'place.write': line<NoFacts>({ admin: true }),
  'species.read': line<NoFacts>({ admin: true, dispatcher: true, vet: true }),
  'species.write': line<NoFacts>({ admin: true }),
  'crate-model.read': line<NoFacts>({ admin: true, dispatcher: true, vet: true }),
  'crate-model.write': line<NoFacts>({ admin: true }),
  'carrier.write': line<NoFacts>({ admin: true }),
  'certificate.write': line<NoFacts>({ admin: true }),
  'mail.list': line<NoFacts>({ admin: true }),
  'mail.resend': line<NoFacts>({ admin: true }),
  'job.list': line<NoFacts>({ admin: true }),
  'audit.list': line<NoFacts>({ admin: true }),
}
