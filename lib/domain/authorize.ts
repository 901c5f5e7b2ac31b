import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { can } from '@/lib/policies/can'
import type { FactsOf, Verb } from '@/lib/policies/can'

/** Throws `not_allowed` unless the policy table lets the actor use the verb on this record. */
export function authorize<V extends Verb>(actor: Actor, verb: V, facts?: FactsOf<V>): void {
  if (!can(actor, verb, facts)) throw new SteadfoldError('not_allowed', 'You may not do this.')
}
