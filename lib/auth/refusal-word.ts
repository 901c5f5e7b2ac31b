/** What next-auth's one word of an error says: see lib/auth/config.ts, which writes it. */
export type SignInRefusal =
  { kind: 'refused'; triesLeft: number } | { kind: 'closed'; untilMs: number } | { kind: 'fault' }

export function readRefusal(word: string): SignInRefusal {
  const [kind, figure] = word.split(':')
  const value = Number(figure)
  if (kind === 'refused' && Number.isInteger(value)) return { kind, triesLeft: value }
  if (kind === 'closed' && Number.isInteger(value)) return { kind, untilMs: value }
  return { kind: 'fault' }
}
