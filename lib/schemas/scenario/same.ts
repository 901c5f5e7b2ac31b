/** True only where two types are identical, optional keys and readonly included; used to hold schema and engine type together. */
export type Same<A, B> = (<T>() => T extends A ? 1 : 2) extends <T>() => T extends B ? 1 : 2 ? true : false
