import { longKinds } from './long-endurance'
import { enduranceMinutes } from '@/lib/views/format'
import type { ChecklistEndurance } from '@/lib/views/checklist'

/** Minutes to alarm and to critical after a failure, at the leg's worst moment; the kind of failure is always named. */
export function EnduranceTable({ rows }: { rows: readonly ChecklistEndurance[] }) {
  const long = longKinds(rows)
  const kinds = [...new Set(rows.map((row) => row.kindWords))].filter((kind) => !long.includes(kind))
  return (
    <section aria-labelledby="endurance" className="bg-sheet px-4 pb-1.5 pt-3">
      <h2 id="endurance" className="text-section">
        Endurance
      </h2>
      {rows.length === 0 && <p className="py-2">Nobody can say for this leg.</p>}
      {long.length > 0 && (
        <p className="pb-2 pt-1">
          <b className="fig">240+ min</b> for every animal, {inWords(long)}.
        </p>
      )}
      {kinds.map((kind) => (
        <table key={kind} className="mb-2 w-full">
          <caption className="pb-1 text-left text-caption text-mute">
            Minutes from the worst moment, {kind}
          </caption>
          <thead>
            <tr className="border-b border-ink text-right text-caption text-mute">
              <th scope="col" className="py-1 text-left">
                Crate
              </th>
              <th scope="col" className="py-1">
                to alarm
              </th>
              <th scope="col" className="py-1">
                to critical
              </th>
            </tr>
          </thead>
          <tbody>
            {rows
              .filter((row) => row.kindWords === kind)
              .map((row) => (
                <tr key={`${row.crateLetter}-${row.name}`} className="border-t border-hair text-right">
                  <th scope="row" className="py-2 text-left font-normal">
                    <span className="crate mr-2 text-section">{row.crateLetter}</span>
                    {row.name}
                  </th>
                  <td className="fig whitespace-nowrap py-2 font-semibold">
                    {enduranceMinutes(row.toAlarmMin)}
                  </td>
                  <td className="fig whitespace-nowrap py-2 font-semibold">
                    {enduranceMinutes(row.toCriticalMin)}
                  </td>
                </tr>
              ))}
          </tbody>
        </table>
      ))}
    </section>
  )
}

function inWords(kinds: readonly string[]): string {
  const last = kinds.at(-1) ?? ''
  return kinds.length < 2 ? last : `${kinds.slice(0, -1).join(', ')} or ${last}`
}
