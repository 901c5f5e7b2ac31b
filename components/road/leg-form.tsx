import type { ReactNode } from 'react'
import { SlatMark } from '@/components/ui/brand'
import { Stamp } from '@/components/ui/stamp'
import {
  clock,
  dayDate,
  dayDateYear,
  duration,
  enduranceMinutes,
  localTime,
  localTimeWithOffset,
  zoneName,
} from '@/lib/views/format'
import { printedCode } from '@/lib/documents/code'
import type { ChecklistLeg, ChecklistView } from '@/lib/views/checklist'
import { longKinds } from './long-endurance'
import { LegFormItems } from './leg-form-items'

const STOPS_IN_A_ROW = 4

/** The checklist on paper: one sheet for each of the driver's legs, with boxes, times, reasons and signature cells. */
export function LegForms({ view }: { view: ChecklistView }) {
  return (
    <div className="hidden print:block">
      {view.legs.map((leg, index) => (
        <LegForm key={leg.legId} view={view} leg={leg} sheet={index + 1} />
      ))}
    </div>
  )
}

function LegForm({ view, leg, sheet }: { view: ChecklistView; leg: ChecklistLeg; sheet: number }) {
  return (
    <article className="break-after-page text-[9.5pt]/[12.5pt] last:break-after-auto">
      <header className="grid grid-cols-[auto_1fr_auto] items-end gap-x-4 border-b-4 border-ink pb-1.5">
        <span className="crate text-[3.25rem]/[2.9rem]">{view.mark}</span>
        <div>
          <h1 className="text-[16pt]/[18pt]">Checklist, leg {leg.ordinal}</h1>
          <p>
            {leg.title}. Driver {view.driverName}. Revision {view.revision}.
          </p>
        </div>
        <div className="text-right text-[8.5pt]/[11pt]">
          <span className="crate mb-0.5 flex items-center justify-end gap-1.5 text-[11pt]">
            <SlatMark width={16} /> STEADFOLD
          </span>
          {view.documentCode && (
            <p>
              Manifest <b className="fig">{printedCode(view.documentCode)}</b>
            </p>
          )}
          <p>
            Made {dayDateYear(view.made.ms, view.made.zone)},{' '}
            {localTimeWithOffset(view.made.ms, view.made.zone)}
          </p>
        </div>
      </header>
      <dl className="grid grid-cols-[1.3fr_1fr_1.1fr_1.1fr] border-x border-b border-ink [&>div+div]:border-l [&>div+div]:border-rule">
        <Box caption="Where">
          <b>{leg.fromPlace === leg.toPlace ? leg.fromPlace : `${leg.fromPlace} to ${leg.toPlace}`}</b>
        </Box>
        <Box caption={`${dayDate(leg.start.ms, leg.start.zone)}, ${zoneName(leg.start.ms, leg.start.zone)}`}>
          {clock(leg.start.ms, leg.start.zone)} to {localTime(leg.end.ms, leg.end.zone)}
        </Box>
        <Box caption={leg.deadlineWords}>
          <b>{clock(leg.end.ms, leg.end.zone)}</b>, {duration(leg.delayWorstMin)} late at most
        </Box>
        <Box caption="Hand over to">{leg.handOverTo || 'nobody: the next leg is yours'}</Box>
      </dl>
      <div className="mt-2 grid grid-cols-[auto_1fr] items-center gap-x-4">
        <Stamp {...view.stamp} size="m" />
        <p>
          <b>{view.headline}</b> {leg.conditionWords}{' '}
          {view.overrides
            .map((one) => `${one.findingWords}: overridden by name by ${one.vetName}.`)
            .join(' ')}
        </p>
      </div>
      <Stops leg={leg} mark={view.mark} />
      <Signs leg={leg} />
      <Notes leg={leg} />
      <LegFormItems leg={leg} crates={view.crates} />
      <Calls calls={view.calls} />
      <dl className="mt-2 grid grid-cols-[1.2fr_1fr_1fr_1.1fr] border border-ink [&>div+div]:border-l [&>div+div]:border-rule [&>div]:pb-5">
        <Box caption="Driver, name in capitals" />
        <Box caption="Signature" />
        <Box caption={`Date, time, ${zoneName(leg.end.ms, leg.end.zone)}`} />
        <Box caption="Office use: typed in by, when" />
      </dl>
      <footer className="mt-2 flex justify-between gap-4 border-t border-ink pt-1 text-[7.5pt]/[10pt]">
        <span>
          {view.mark}, checklist leg {leg.ordinal}, revision {view.revision}. Sheet {sheet} of{' '}
          {view.legs.length}, one for each of your legs. Keep with the crates.
        </span>
        <span>A decision aid: law and carrier’s rules stand</span>
      </footer>
    </article>
  )
}

function Box({ caption, children }: { caption: ReactNode; children?: ReactNode }) {
  return (
    <div className="min-w-0 px-2 pb-1 pt-0.5">
      <dt className="text-[8pt]/[10pt]">{caption}</dt>
      <dd className="m-0">{children}</dd>
    </div>
  )
}

function Stops({ leg, mark }: { leg: ChecklistLeg; mark: string }) {
  const long = longKinds(leg.endurance)
  const worst = leg.endurance
    .filter((row) => row.toAlarmMin !== null && !long.includes(row.kindWords))
    .sort((a, b) => (a.toAlarmMin ?? 0) - (b.toAlarmMin ?? 0))
    .slice(0, 3)
  return (
    <section className="mt-2 break-inside-avoid border-4 border-ink">
      <p className="flex items-baseline justify-between gap-4 border-b-2 border-ink px-2.5 py-0.5">
        <b className="font-head text-[11.5pt] font-bold">Stop and ring the desk if the air at a crate is</b>
        <span className="text-[8.5pt]">read at its openings, at the height of the head</span>
      </p>
      <div
        className="grid"
        style={{
          gridTemplateColumns: `repeat(${Math.min(STOPS_IN_A_ROW, Math.max(1, leg.stops.length))}, 1fr)`,
        }}
      >
        {leg.stops.map((stop) => (
          <div key={stop.crateId} className="-ml-px border-l border-rule px-2.5 py-1">
            <p>
              <span className="crate text-[15pt]">
                {mark}-{stop.crateLetter}
              </span>{' '}
              <span className="text-[9pt]">{stop.animals}</span>
            </p>
            <Figure word="above" c={stop.aboveC} f={stop.aboveF} />
            <Figure word="below" c={stop.belowC} f={stop.belowF} />
          </div>
        ))}
      </div>
      <p className="border-t border-rule px-2.5 py-1">
        <b>Endurance, least first, to alarm:</b>{' '}
        {leg.endurance.length === 0 && 'nobody can say for this leg.'}
        {worst
          .map((row) => `${row.crateLetter} ${enduranceMinutes(row.toAlarmMin)} ${row.kindWords}`)
          .join('; ')}
        {worst.length > 0 && long.length > 0 && '; '}
        {long.length > 0 && `240+ min, every animal, ${long.join(', ')}.`}
      </p>
    </section>
  )
}

function Figure({ word, c, f }: { word: string; c: number | null; f: number | null }) {
  const spell = (whole: number) => String(whole).replace('-', '\u2212')
  return (
    <>
      <span className="block text-[8pt]/[9pt]">{word}</span>
      {c === null ? (
        <span>none found</span>
      ) : (
        <span className="fig whitespace-nowrap font-semibold">
          <span className="text-[22pt]/[22pt] tracking-[-.03em]">{spell(c)} °C</span>
          {f !== null && <span className="ml-2 text-[13pt]">{spell(f)} °F</span>}
        </span>
      )}
    </>
  )
}

function Signs({ leg }: { leg: ChecklistLeg }) {
  if (leg.signs.length + leg.cautions.length === 0) return null
  return (
    <section className="mt-1.5 break-inside-avoid">
      <h2 className="text-[11.5pt]/[14pt]">Early signs: ring when you see one</h2>
      <ul className="mt-0.5 columns-2 list-none gap-x-4 border border-ink px-2.5 py-1">
        {leg.signs.map((sign) => (
          <li
            key={`${sign.crateLetter}-${sign.text}`}
            className="grid break-inside-avoid grid-cols-[18px_1fr]"
          >
            <span className="crate">{sign.crateLetter}</span>
            <span>{sign.text}</span>
          </li>
        ))}
        {leg.cautions.map((caution) => (
          <li key={caution} className="break-inside-avoid">
            {caution}
          </li>
        ))}
      </ul>
    </section>
  )
}

function Notes({ leg }: { leg: ChecklistLeg }) {
  if (leg.notes.length === 0) return null
  return (
    <section className="mt-1.5 break-inside-avoid border border-ink px-2.5 py-1">
      {leg.notes.map(({ head, text }) => (
        <p key={head} className="[overflow-wrap:anywhere]">
          <b>{head}:</b> {text}
        </p>
      ))}
    </section>
  )
}

function Calls({ calls }: { calls: ChecklistView['calls'] }) {
  return (
    <section className="mt-1.5 break-inside-avoid">
      <h2 className="flex items-baseline gap-2.5 text-[11.5pt]/[14pt]">
        Ring in this order{' '}
        <span className="font-text text-[8.5pt] font-normal">5 min without an answer, ring the next</span>
      </h2>
      <ol className="mt-0.5 grid list-none grid-cols-4 border border-ink [&>li+li]:border-l [&>li+li]:border-rule">
        {calls.slice(0, 4).map((call) => (
          <li key={call.number} className="min-w-0 px-2 py-1">
            <b className="mr-1 font-head">{call.number}</b>
            <b className="fig whitespace-nowrap text-[9pt]">{call.telephone}</b>
            <span className="block text-[8.5pt]/[11pt]">
              {[call.who, call.purpose].filter(Boolean).join(', ')}
            </span>
          </li>
        ))}
      </ol>
    </section>
  )
}
