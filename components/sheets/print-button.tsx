'use client'

import { Button } from '@/components/ui/button'

/** Prints the page as it stands; the issued paper with its seal is the PDF. */
export function PrintButton() {
  return <Button onClick={() => window.print()}>Print this sheet</Button>
}
