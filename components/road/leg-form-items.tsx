import { zoneName } from '@/lib/views/format'
import type { ChecklistItem, ChecklistLeg, ChecklistView } from '@/lib/views/checklist'

const MOST_LARGE = 8

/** The items as a form: a box, a time and a reason for each. What was entered by phone is not printed: paper is written on. */
export function LegFormItems({ leg, crates }: { leg: ChecklistLeg; crates: ChecklistView['crates'] }) {
  // The list stays on one sheet: a long one is set a little smaller.
  const row = leg.items.length > MOST_LARGE ? 'h-[25px] text-[10.5pt]/[11.5pt]' : 'h-8 text-[12pt]/[14pt]'
  return (
    <section className="mt-1.5">
      <h2 className="flex items-baseline gap-2.5 text-[11.5pt]/[14pt]">
        Items{' '}
        <span className="font-text text-[8.5pt] font-normal">
          tick, or write why not; a leg closes with both
        </span>
      </h2>
      <table className="mt-0.5 w-full border-y-2 border-ink [&_td+td]:border-l [&_td+td]:border-rule [&_th+th]:border-l [&_th+th]:border-rule">
        <thead>
          <tr className="border-b border-ink text-left text-[8.5pt]">
            <th scope="col" className="px-1.5">
              No.
            </th>
            <th scope="col" className="px-1.5">
              What
            </th>
            <th scope="col" className="px-1.5 text-center">
              Done
            </th>
            <th scope="col" className="w-[54px] px-1.5">
              Time, {zoneName(leg.end.ms, leg.end.zone)}
            </th>
            <th scope="col" className="w-[128px] px-1.5">
              Not done, because
            </th>
          </tr>
        </thead>
        <tbody>
          {leg.items.map((item) => (
            <tr key={item.key} className={`break-inside-avoid border-t border-hair ${row}`}>
              <td className="w-7 px-1.5 font-head font-bold">{item.number}</td>
              <td className="px-1.5 py-px">
                {item.text}
                <Lines item={item} crates={crates} />
              </td>
              <td className="px-1.5">
                <span className="mx-auto block size-5 border-2 border-ink" />
              </td>
              <td />
              <td />
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  )
}

/** What has to be written besides the tick. */
function Lines({ item, crates }: { item: ChecklistItem; crates: ChecklistView['crates'] }) {
  if (item.kind === 'reading')
    return (
      <span className="block">
        <span className="text-[9pt]">°C</span>{' '}
        {crates.map((crate) => (
          <Blank key={crate.crateId} word={crate.letter} />
        ))}
      </span>
    )
  if (item.kind === 'handover')
    return (
      <span className="block">
        {['alive', 'dead', 'short', 'to whom'].map((word) => (
          <Blank key={word} word={word} />
        ))}
      </span>
    )
  return null
}

function Blank({ word }: { word: string }) {
  return (
    <span className="mr-3 inline-block whitespace-nowrap text-[9pt]">
      {word} <span className="inline-block w-10 border-b border-ink">&nbsp;</span>
    </span>
  )
}
