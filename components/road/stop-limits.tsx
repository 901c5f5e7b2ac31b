import type { ChecklistStop } from '@/lib/views/checklist'

/** The limits at which to stop, large; °F small under each, already rounded to the safe side. */
export function StopLimits({ stops }: { stops: readonly ChecklistStop[] }) {
  return (
    <section aria-labelledby="stop" className="border-5 border-ink bg-sheet px-3 pb-1 pt-2.5">
      <h2 id="stop" className="text-section">
        Stop and ring the desk if
      </h2>
      <p className="text-caption text-mute">the air at a crate, read at its openings, is</p>
      {stops.length === 0 && (
        <p className="py-2">No stop limit is known for this leg. Ring the desk before you leave.</p>
      )}
      {stops.length > 0 && (
        <table className="mt-1 w-full">
          <thead>
            <tr className="text-left text-caption text-mute">
              <th scope="col" className="py-1">
                Crate
              </th>
              <th scope="col" className="py-1">
                above
              </th>
              <th scope="col" className="py-1">
                below
              </th>
            </tr>
          </thead>
          <tbody>
            {stops.map((stop) => (
              <tr key={stop.crateId} className="border-t border-rule align-top">
                <th scope="row" className="py-1.5 text-left font-normal">
                  <span className="crate mr-1.5 inline-block min-w-[30px] text-mark-phone">
                    {stop.crateLetter}
                  </span>
                  <span className="text-small">{stop.animals}</span>
                </th>
                <LimitCell c={stop.aboveC} f={stop.aboveF} />
                <LimitCell c={stop.belowC} f={stop.belowF} />
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </section>
  )
}

function LimitCell({ c, f }: { c: number | null; f: number | null }) {
  return (
    <td className="whitespace-nowrap py-1.5">
      {c === null ? (
        <span className="text-small">none found</span>
      ) : (
        <>
          <span className="fig text-[1.875rem]/8 font-semibold tracking-[-.03em]">{spell(c)} °C</span>
          {f !== null && <span className="block text-caption text-mute">{spell(f)} °F</span>}
        </>
      )}
    </td>
  )
}

function spell(whole: number): string {
  return String(whole).replace('-', '\u2212')
}
