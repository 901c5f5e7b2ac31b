import type { ItemState } from './item-states'

/** The 34 px box in its 44 px target. Where an item asks for more than a tick, the box only shows. */
export function ItemBox({
  label,
  state,
  onTick,
}: {
  label: string
  state: ItemState['state']
  onTick: (() => void) | undefined
}) {
  const drawing = (
    <svg
      aria-hidden="true"
      viewBox="0 0 34 34"
      width="34"
      height="34"
      className="block fill-none stroke-hand"
    >
      <rect x="1.5" y="1.5" width="31" height="31" strokeWidth="3" className="fill-sheet" />
      {state === 'done' && <path d="M8.5 18 14.5 24 26 9.5" strokeWidth="4" />}
      {state === 'not-done' && <path d="M9 17H25" strokeWidth="4" />}
    </svg>
  )
  if (!onTick) return <span className="-ml-[5px] -mt-[5px] block size-11 p-[5px]">{drawing}</span>
  return (
    <button
      type="button"
      role="checkbox"
      aria-checked={false}
      aria-label={label}
      onClick={onTick}
      className="-ml-[5px] -mt-[5px] block size-11 cursor-pointer p-[5px]"
    >
      {drawing}
    </button>
  )
}
