'use client'

import { RouteError } from '@/components/consignments/route-error'
import type { RouteErrorProps } from '@/components/consignments/route-error'

export default function PageError(props: RouteErrorProps) {
  return (
    <RouteError {...props} title="The plan editor stopped">
      What was typed is kept in this browser and comes back when the page opens again.
    </RouteError>
  )
}
