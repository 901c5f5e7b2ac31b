/** The day before the animals leave. */
export const NOW = new Date('2026-06-09T08:00:00.000Z')

export const later = (minutes: number) => new Date(NOW.getTime() + minutes * 60_000)

/** An assessment is done a minute after it was asked for. */
export const ASSESSED_AT = (now: Date) => new Date(now.getTime() + 60_000)
