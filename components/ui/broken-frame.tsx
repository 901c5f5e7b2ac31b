/**
 * A broken rule round its parent (which is `relative` and sets --w, --d and --g: width, dash, gap). Drawn as a stroke: a
 * CSS border's dashes have no fixed length, and a background would neither print nor survive forced colours. Half of the
 * stroke is cut off by the edge.
 */
export function BrokenFrame() {
  return (
    <svg aria-hidden="true" className="absolute inset-0 block size-full overflow-hidden">
      <rect
        width="100%"
        height="100%"
        fill="none"
        stroke="currentColor"
        className="[stroke-dasharray:var(--d)_var(--g)] [stroke-width:calc(var(--w)*2)]"
      />
    </svg>
  )
}

/** The broken upright before the count of conditions. */
export function BrokenUpright() {
  return (
    <svg aria-hidden="true" className="absolute inset-y-0 left-0 block h-full w-(--w) overflow-hidden">
      <line
        x1="50%"
        x2="50%"
        y1="0"
        y2="100%"
        stroke="currentColor"
        className="[stroke-dasharray:var(--d)_var(--g)] [stroke-width:var(--w)]"
      />
    </svg>
  )
}
