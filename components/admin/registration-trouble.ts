import type { RegistrationView } from '@/lib/views/administration'

const WARNED_DAYS = 60
const DAY_MS = 86_400_000

/** Why a vet can't sign, or soon won't be able to; null where the record is whole. Days are calendar days, "2027-03-31". */
export function registrationTrouble(registration: RegistrationView | null, today: string): string | null {
  if (registration === null) return 'no registration kept: can’t sign'
  if (registration.checked === null) return 'not checked by an admin: can’t sign'
  const daysLeft = Math.round((Date.parse(registration.expiresOn) - Date.parse(today)) / DAY_MS)
  if (daysLeft < 0) return `ended ${registration.expiresOn}: can’t sign`
  if (daysLeft === 0) return 'ends today'
  return daysLeft <= WARNED_DAYS ? `ends in ${daysLeft} ${daysLeft === 1 ? 'day' : 'days'}` : null
}
