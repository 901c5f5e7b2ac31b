import { INK } from '@/lib/documents/parts/words'

/** A name set as somebody's hand: the only violet on paper, and it prints as dark grey. */
export const signature = { fontStyle: 'italic', color: INK.hand } as const
