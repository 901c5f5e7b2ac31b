import { dayDate, localTime } from '@/lib/views/format'
import type { SheetView } from '@/lib/views/sheet'

/** What the sheet speaks of: hashes and versions, so that anybody can tell whether a later one says the same. */
export function Provenance({ view }: { view: SheetView }) {
  return (
    <dl className="grid gap-x-6 gap-y-1 desk:grid-cols-[max-content_1fr_max-content_1fr]">
      <Fact words="Plan hash" figure>
        {view.planHash}
      </Fact>
      <Fact words="Assessed">
        {view.assessed === null
          ? 'not assessed'
          : `${dayDate(view.assessed.ms, view.assessed.zone)}, ${localTime(view.assessed.ms, view.assessed.zone)}${view.assessedBy ? `, by ${view.assessedBy}` : ''}`}
      </Fact>
      <Fact words="Input hash" figure>
        {view.inputHash}
      </Fact>
      <Fact words="Weather">{view.weatherWords || 'none given'}</Fact>
      <Fact words="Versions">{view.versionWords}</Fact>
      <Fact words="Runs">{view.runWords}</Fact>
    </dl>
  )
}

function Fact({ words, figure = false, children }: { words: string; figure?: boolean; children: string }) {
  return (
    <div className="contents">
      <dt className="text-mute">{words}</dt>
      <dd className={figure ? 'fig m-0 break-all text-small' : 'm-0'}>
        {figure ? (children.match(/.{1,8}/g) ?? []).join(' ') || 'none yet' : children}
      </dd>
    </div>
  )
}

/** What the figures cannot do, in the words of every paper. */
export function Cautions({ cautions }: { cautions: SheetView['cautions'] }) {
  return (
    <div className="grid gap-x-6 gap-y-2 text-small desk:grid-cols-3">
      {cautions.map(({ bold, text }) => (
        <p key={text}>
          {bold && <b>{bold} </b>}
          {text}
        </p>
      ))}
    </div>
  )
}

/** Who overrode what, and why: stands beside the stamp wherever the stamp stands. */
export function Overrides({ overrides }: { overrides: SheetView['overrides'] }) {
  if (overrides.length === 0) return null
  return (
    <ul className="list-none">
      {overrides.map((override) => (
        <li key={override.findingIndex}>
          <b>Overridden: {override.findingWords}.</b> {override.vetName},{' '}
          {dayDate(override.signedAt.ms, override.signedAt.zone)}{' '}
          {localTime(override.signedAt.ms, override.signedAt.zone)}: {override.reason}
        </li>
      ))}
    </ul>
  )
}
