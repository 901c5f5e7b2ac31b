import 'server-only'

/** Writes down a fault nobody expected, as one line of JSON on standard error. People are told only that there was one. */
export function logFault(where: string, error: unknown): void {
  const { name, message, stack } = error instanceof Error ? error : new Error(String(error))
  process.stderr.write(`${JSON.stringify({ at: new Date().toISOString(), where, name, message, stack })}\n`)
}
