'use client'

import { Attention } from '@/components/ui/notice'
import { useFieldError } from './plan-fields'
import type { PlanPath } from './plan-fields'
import { planPathId } from './plan-path'

/** What is wrong in the cells of one row, under it and as wide as the table; takes no room while nothing is. */
export function RowErrors({ paths, columns }: { paths: readonly PlanPath[]; columns: number }) {
  return (
    <tr className="max-desk:!border-0 max-desk:!p-0">
      <td colSpan={columns} className="max-desk:!px-3">
        {paths.map((path) => (
          <RowError key={path} path={path} />
        ))}
      </td>
    </tr>
  )
}

function RowError({ path }: { path: PlanPath }) {
  const error = useFieldError(path)
  return error === undefined ? null : (
    <span className="block pb-1.5">
      <Attention id={`${planPathId(path)}-error`}>{error}</Attention>
    </span>
  )
}
