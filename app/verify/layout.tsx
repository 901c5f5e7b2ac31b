import type { ReactNode } from 'react'
import { Top } from '@/components/ui/top'
import { firm } from '@/lib/domain/firm'

/** Open to everybody: no session is looked for. */
export default function VerifyLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <Top home="/verify" words={`Verification, open to everybody. ${firm().name}`} />
      {children}
    </>
  )
}
