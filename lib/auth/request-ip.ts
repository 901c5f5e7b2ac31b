import { env } from '@/lib/env'

/**
 * Where a request came from, for the audit trail and for limits: the address of its connection, or behind a trusted proxy
 * (TRUST_PROXY=yes) the one that proxy added last. Null where nothing vouches for the header: a request may say of itself
 * what it likes.
 */
export function requestIp(
  headers: Headers | Record<string, unknown>,
  vouchedFor = isVouchedFor(),
): string | null {
  if (!vouchedFor) return null
  const forwarded = headers instanceof Headers ? headers.get('x-forwarded-for') : headers['x-forwarded-for']
  if (typeof forwarded !== 'string') return null
  const last = forwarded.split(',').at(-1)?.trim() ?? ''
  const bare = last.replace(/^::ffff:/, '').replace(/%.*$/, '')
  return /^[0-9a-fA-F.:]{2,45}$/.test(bare) ? bare : null
}

/** True behind a trusted proxy, and in a web server that puts the address itself (lib/local/own-address.mjs). */
function isVouchedFor(): boolean {
  const { steadfoldOwnAddress } = globalThis as { steadfoldOwnAddress?: boolean }
  return steadfoldOwnAddress === true || env().trustProxy
}
