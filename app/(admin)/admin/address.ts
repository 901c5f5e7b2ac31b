/** An address with the given questions; empty ones are left out. */
export function addressOf(
  path: string,
  query: Record<string, string | number | null | undefined | readonly string[]>,
): string {
  const search = new URLSearchParams()
  for (const [name, value] of Object.entries(query)) {
    for (const one of [value ?? []].flat()) if (one !== '') search.append(name, String(one))
  }
  const text = search.toString()
  return text === '' ? path : `${path}?${text}`
}
