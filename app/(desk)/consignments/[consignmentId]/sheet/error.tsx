'use client'

import { RouteError } from '@/components/consignments/route-error'
import type { RouteErrorProps } from '@/components/consignments/route-error'

export default function PageError(props: RouteErrorProps) {
  return (
    <RouteError {...props} title="The sheet cannot be shown">
      Nothing was changed by it. An issued paper is still under Papers.
    </RouteError>
  )
}
