import 'server-only'
import { env } from '@/lib/env'
import type { Moment, SheetFirm } from '@/lib/views/sheet'

/** The courier firm of this installation, as papers and pages name it. */
export function firm(): SheetFirm {
  const { name, telephone } = env().firm
  return { name, town: 'Glasgow', deskTelephone: telephone, deskHours: '24 hours', zone: FIRM_ZONE }
}

/** The clock on the desk's wall: what the firm's own lists are told in. */
export const FIRM_ZONE = 'Europe/London'

export function deskMoment(at: Date): Moment {
  return { ms: at.getTime(), zone: FIRM_ZONE }
}
