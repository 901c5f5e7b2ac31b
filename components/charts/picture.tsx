import { memo } from 'react'
import type { Picture } from '@/lib/views/charts/marks'
import { Marks } from './marks'

/** A drawn picture with its one-sentence summary. On paper it may shrink to the sheet; on a screen it never scales. */
export const PictureSvg = memo(function PictureSvg({
  picture,
  summary,
}: {
  picture: Picture
  /** Absent: the picture only repeats words beside it. */
  summary?: string
}) {
  return (
    <svg
      width={picture.width}
      height={picture.height}
      viewBox={`0 0 ${picture.width} ${picture.height}`}
      role={summary ? 'img' : undefined}
      aria-label={summary}
      aria-hidden={summary ? undefined : true}
      className="block print:h-auto print:max-w-full"
    >
      <Marks marks={picture.marks} />
    </svg>
  )
})
