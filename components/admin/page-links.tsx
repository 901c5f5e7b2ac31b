import type { ReactNode } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { Paging } from '@/components/ui/tabs'

/** Keyset paging by two buttons that name what comes; the one that leads nowhere is dotted and says why. */
export function PageLinks({
  words,
  before,
  after,
}: {
  words: ReactNode
  before: { href: string | null; words: string; none: string }
  after: { href: string | null; words: string; none: string }
}) {
  return <Paging words={words} before={<Way {...before} />} after={<Way {...after} />} />
}

function Way({ href, words, none }: { href: string | null; words: string; none: string }) {
  return href === null ? (
    <Button refused={none}>{words}</Button>
  ) : (
    <ButtonLink href={href}>{words}</ButtonLink>
  )
}
