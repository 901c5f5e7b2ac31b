/** "2026-06-09T09:20" as a field shows it: "2026-06-09 09:20". What isn't a time stays as typed. */
export function localText(value: string): string {
  return value.replace(/^(\d{4}-\d{2}-\d{2})T(\d{2}:\d{2})$/, '$1 $2')
}

/** What people type, as the schema reads it; "2026-6-9 9.20" is understood, anything else comes back as typed. */
export function parseLocalTime(typed: string): string {
  const match = /^\s*(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})[T\s,]+(\d{1,2})[:.](\d{2})\s*$/.exec(typed)
  if (!match) return typed.trim()
  const [, year, month, day, hour, minute] = match
  return `${year}-${pad(month)}-${pad(day)}T${pad(hour)}:${minute}`
}

function pad(part: string | undefined): string {
  return (part ?? '').padStart(2, '0')
}
