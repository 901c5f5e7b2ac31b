import type { Actor, Role } from './actor'
import { ROLES } from './actor'
import { administrationPolicy } from './administration'
import { approvalPolicy } from './approval'
import { consignmentPolicy } from './consignment'
import { documentPolicy } from './document'
import { runPolicy } from './run'
import type { Line } from './table'

/** Every verb and which role may use it on what. Anything not written here is refused. */
export const POLICY = {
  ...consignmentPolicy,
  ...approvalPolicy,
  ...runPolicy,
  ...documentPolicy,
  ...administrationPolicy,
}

export type Verb = keyof typeof POLICY
export const VERBS = Object.keys(POLICY) as readonly Verb[]

/** The record a verb's policy looks at; undefined where it looks at none. */
export type FactsOf<V extends Verb> = (typeof POLICY)[V] extends Line<infer Facts> ? Facts : never

/**
 * Whether the actor may use the verb on this record. Nobody signed in, an unknown verb or role, or a record the policy
 * needs and did not get: no.
 */
export function can<V extends Verb>(actor: Actor | null, verb: V, facts?: FactsOf<V>): boolean {
  const permission = permissionOf(actor, verb)
  if (permission === undefined || actor === null) return false
  if (permission === true) return true
  return facts !== undefined && permission(actor, facts)
}

/** Whether the actor's role has the verb at all, on some record: for menus. The verb itself asks `can` again. */
export function mayEver(actor: Actor | null, verb: Verb): boolean {
  return permissionOf(actor, verb) !== undefined
}

function permissionOf<V extends Verb>(actor: Actor | null, verb: V) {
  if (actor === null || !isRole(actor.role) || !Object.hasOwn(POLICY, verb)) return undefined
  const line = POLICY[verb] as Line<FactsOf<V>>
  return Object.hasOwn(line, actor.role) ? line[actor.role] : undefined
}

function isRole(role: string): role is Role {
  return (ROLES as readonly string[]).includes(role)
}
