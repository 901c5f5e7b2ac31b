/**
 * Where a request came from, for the audit trail and for limits: the address the server put down, or the one a proxy in
 * front of it added last. Null where there is none.
 */
export function requestIp(headers: Headers | Record<string, unknown>): string | null {
  const forwarded = headers instanceof Headers ? headers.get('x-forwarded-for') : headers['x-forwarded-for']
  if (typeof forwarded !== 'string') return null
  const last = forwarded.split(',').at(-1)?.trim() ?? ''
  const bare = last.replace(/^::ffff:/, '')
  return /^[0-9a-fA-F.:]{2,45}$/.test(bare) ? bare : null
}
