import 'server-only'
import { hash, verify } from '@node-rs/argon2'

/*
 * argon2id with the library's defaults (19 MiB, 2 passes, 1 lane), which are the first choice of the OWASP Password
 * Storage Cheat Sheet. The parameters stand in the hash, so raising them later breaks no account.
 */

export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFKC'))
}

/** Whether the password is the one behind the hash. A hash that is none counts as a wrong password. */
export async function isPassword(passwordHash: string, password: string): Promise<boolean> {
  try {
    return await verify(passwordHash, password.normalize('NFKC'))
  } catch {
    return false
  }
}

/** A hash of nothing anybody knows: checking against it costs as much time as checking a real one. */
let nobodysHash: Promise<string> | undefined

/** Takes as long as a wrong password does, where there is no account to check: time must not tell who has one. */
export async function isNobodysPassword(password: string): Promise<false> {
  nobodysHash ??= hashPassword(crypto.randomUUID())
  await isPassword(await nobodysHash, password)
  return false
}
