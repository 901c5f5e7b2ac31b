/**
 * A broken rule round its parent (which is `relative`). Drawn as a stroke: a CSS border's dashes have no fixed length, and
 * a background would neither print nor survive forced colours. Half of the stroke is cut off by the edge.
 */
export function BrokenFrame({ width, dash, gap }: { width: number; dash: number; gap: number }) {
  return (
    <svg aria-hidden="true" className="absolute inset-0 block size-full overflow-hidden">
      <rect
        width="100%"
        height="100%"
        fill="none"
        stroke="currentColor"
        strokeWidth={width * 2}
        strokeDasharray={`${dash} ${gap}`}
      />
    </svg>
  )
}

/** The broken upright before the count of conditions. */
export function BrokenUpright({ width, dash, gap }: { width: number; dash: number; gap: number }) {
  return (
    <svg aria-hidden="true" width={width} className="absolute inset-y-0 left-0 block h-full">
      <line
        x1={width / 2}
        x2={width / 2}
        y1="0"
        y2="100%"
        stroke="currentColor"
        strokeWidth={width}
        strokeDasharray={`${dash} ${gap}`}
      />
    </svg>
  )
}
