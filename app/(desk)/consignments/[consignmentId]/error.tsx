'use client'

import { RouteError } from '@/components/consignments/route-error'
import type { RouteErrorProps } from '@/components/consignments/route-error'

export default function PageError(props: RouteErrorProps) {
  return (
    <RouteError {...props} title="This consignment cannot be shown">
      Nothing was changed by it; plan, approvals and papers stand as they were.
    </RouteError>
  )
}
