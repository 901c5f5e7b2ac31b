'use client'

import { RouteError } from '@/components/consignments/route-error'
import type { RouteErrorProps } from '@/components/consignments/route-error'

export default function PageError(props: RouteErrorProps) {
  return (
    <RouteError {...props} title="The board stopped">
      Nothing was changed by it.
    </RouteError>
  )
}
