import { join } from '@/components/ui/join'

/**
 * The name of a field in a cell: for ears on the desk, where the head of the column stands above it; on a phone, where rows
 * are folded, in sight with its unit.
 */
export function CellLabel({ row, words, unit = '' }: { row: string; words: string; unit?: string }) {
  return (
    <>
      <span className="sr-only">{row}, </span>
      <span
        data-unit={unit}
        className={join(
          'desk:sr-only max-desk:inline-block max-desk:first-letter:uppercase',
          unit !== '' && 'max-desk:after:font-normal max-desk:after:content-[",_"_attr(data-unit)]',
        )}
      >
        {words}
      </span>
    </>
  )
}
