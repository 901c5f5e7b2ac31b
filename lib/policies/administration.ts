import type { Line, NoFacts } from './table'

/** The firm's own records. Catalogues are read by those who plan and judge, and written by an admin. */
export const administrationPolicy = {
  'user.list': { admin: true } satisfies Line<NoFacts>,
  'user.write': { admin: true } satisfies Line<NoFacts>,
  'shipper.list': { admin: true, dispatcher: true } satisfies Line<NoFacts>,
  'shipper.write': { admin: true } satisfies Line<NoFacts>,
  'place.list': { admin: true, dispatcher: true, vet: true } satisfies Line<NoFacts>,
  'place.write': { admin: true } satisfies Line<NoFacts>,
  'species.read': { admin: true, dispatcher: true, vet: true } satisfies Line<NoFacts>,
  'species.write': { admin: true } satisfies Line<NoFacts>,
  'crate-model.read': { admin: true, dispatcher: true, vet: true } satisfies Line<NoFacts>,
  'crate-model.write': { admin: true } satisfies Line<NoFacts>,
  'carrier.write': { admin: true } satisfies Line<NoFacts>,
  'certificate.write': { admin: true } satisfies Line<NoFacts>,
  'mail.list': { admin: true } satisfies Line<NoFacts>,
  'mail.resend': { admin: true } satisfies Line<NoFacts>,
  'job.list': { admin: true } satisfies Line<NoFacts>,
  'audit.list': { admin: true } satisfies Line<NoFacts>,
}
