import type { Actor, Role } from './actor'

/** Whether a role may use a verb: always, or only on records that pass the test. A role without a line may not. */
export type Permission<Facts> = true | ((actor: Actor, facts: Facts) => boolean)
export type Line<Facts> = Partial<Record<Role, Permission<Facts>>>

/** Facts of a verb that is about no record in particular. */
export type NoFacts = undefined

/** Writes a line of a policy table and ties it to the facts it looks at. */
export function line<Facts>(roles: Line<Facts>): Line<Facts> {
  return roles
}
