import { z } from 'zod'

/**
 * The same schema, which besides refuses fields it does not know: they would be dropped without a word, as if they had been
 * taken into account. Stored documents are read by the plain schema, so that an old one with a field more stays readable.
 */
export function withoutStrays<Schema extends z.ZodType>(schema: Schema, what: string) {
  return z.unknown().transform((input, context): z.output<Schema> => {
    const parsed = schema.safeParse(input)
    if (!parsed.success) {
      for (const { path, message } of parsed.error.issues) context.addIssue({ code: 'custom', path, message })
      return z.NEVER
    }
    for (const path of strayPaths(input, parsed.data))
      context.addIssue({
        code: 'custom',
        path,
        message: `“${String(path.at(-1))}” is not a field of ${what}: nothing would count it, so it is refused.`,
      })
    return parsed.data
  })
}

/** Where the input holds a key that the parsed value has not. */
function strayPaths(input: unknown, parsed: unknown, at: PropertyKey[] = []): PropertyKey[][] {
  if (typeof input !== 'object' || input === null || typeof parsed !== 'object' || parsed === null) return []
  return Object.entries(input).flatMap(([key, value]) =>
    key in parsed
      ? strayPaths(value, Reflect.get(parsed, key), [...at, Array.isArray(input) ? Number(key) : key])
      : [[...at, key]],
  )
}
