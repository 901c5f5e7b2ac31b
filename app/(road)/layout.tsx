import type { ReactNode } from 'react'
import { SignedInTop } from '@/app/signed-in-top'

export default function Layout({ children }: { children: ReactNode }) {
  return (
    <>
      <SignedInTop />
      {children}
    </>
  )
}
