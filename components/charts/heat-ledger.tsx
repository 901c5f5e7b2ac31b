'use client'

import { useMemo } from 'react'
import type { ReactNode } from 'react'
import { useWidth } from '@/components/hooks/use-width'
import { Cell, Head, Ledger, Row, RowHead } from '@/components/ui/ledger'
import { TableToggle } from '@/components/ui/table-toggle'
import { SCREENS } from '@/lib/tokens'
import { localTime } from '@/lib/views/format'
import { LEFT, READING_COLUMN } from '@/lib/views/charts/corridor'
import { xAt } from '@/lib/views/charts/frame'
import { ledger, ledgerAt } from '@/lib/views/charts/ledger'
import type { LedgerInput, LedgerReading } from '@/lib/views/charts/ledger'
import { zoneAt } from '@/lib/views/charts/ruler'
import { PictureSvg } from './picture'

/** Where the heat comes from and goes to, on the corridor's time axis and under its reading line. */
export function HeatLedger({
  input,
  minute,
  departureMs,
  zones,
  title = 'Heat ledger',
}: {
  input: LedgerInput
  /** Minute of the reading line. */
  minute: number
  departureMs: number
  zones: readonly { zone: string; fromMin: number }[]
  title?: ReactNode
}) {
  const [box, measured] = useWidth<HTMLDivElement>()
  const width = measured ?? 1232
  const picture = useMemo(() => ledger(input, { width, left: LEFT, right: READING_COLUMN }), [input, width])
  const reading = ledgerAt(input.heat, minute)
  const time = localTime(departureMs + minute * 60_000, zoneAt(zones, minute))
  const narrow = measured !== null && measured < SCREENS.desk - 48
  const words = narrow
    ? `${time}, watts. Black is gained, grey is lost; the five add up to storage`
    : `Watts, ${picture.meansWords}. Solid is gained, grey is lost; the five add up to storage`
  return (
    <TableToggle
      title={title}
      words={words}
      picture={
        <div ref={box} className="overflow-hidden">
          {narrow ? (
            <LedgerNow reading={reading} time={time} />
          ) : (
            <div className="relative print:!h-auto print:!w-full" style={{ width, height: picture.height }}>
              <PictureSvg picture={picture} summary={summaryOf(reading, time)} />
              <div aria-hidden="true" className="no-print">
                <span
                  className="pointer-events-none absolute w-0.5 bg-hand"
                  style={{
                    left: xAt(picture.time, minute) - 1,
                    top: picture.top,
                    height: picture.height - picture.top - 8,
                  }}
                />
                <ReadingColumn {...{ picture, reading, time }} />
              </div>
            </div>
          )}
        </div>
      }
      table={<LedgerNow reading={reading} time={time} />}
    />
  )
}

function ReadingColumn({
  picture,
  reading,
  time,
}: {
  picture: ReturnType<typeof ledger>
  reading: ReturnType<typeof ledgerAt>
  time: string
}) {
  const left = picture.time.x1 + 14
  const style = (y: number) => ({ left, top: y - 10, width: picture.width - left - 2 })
  return (
    <>
      <p className="absolute text-caption font-semibold text-hand" style={style(18)}>
        At {time}
      </p>
      {[...reading.accounts, reading.storage].map((row, index) => (
        <p
          key={row.name}
          className={`absolute flex justify-between text-caption ${row.name === 'Storage' ? 'font-semibold' : ''}`}
          style={style(picture.baselines[index] ?? 0)}
        >
          <span>{row.name}</span>
          <span className="text-small">{row.value} W</span>
        </p>
      ))}
    </>
  )
}

/** The accounts of one minute as a small ledger: bars, figures, double rule, sum. */
export function LedgerNow({ reading, time }: { reading: ReturnType<typeof ledgerAt>; time: string }) {
  const largest = Math.max(
    ...[...reading.accounts, reading.storage].map(({ watts }) => Math.abs(watts)),
    1e-6,
  )
  return (
    <Ledger caption={`Heat balance at ${time}, watts`}>
      <thead className="sr-only">
        <tr>
          <Head>Account</Head>
          <Head>Bar</Head>
          <Head numeric>Watts at {time}</Head>
        </tr>
      </thead>
      <tbody className="[&_td]:!border-l-0">
        {reading.accounts.map((row) => (
          <LedgerRow key={row.name} row={row} largest={largest} />
        ))}
        <LedgerRow row={reading.storage} largest={largest} sum />
      </tbody>
    </Ledger>
  )
}

function LedgerRow({ row, largest, sum = false }: { row: LedgerReading; largest: number; sum?: boolean }) {
  const length = (Math.abs(row.watts) / largest) * 70
  const edge = sum ? '!border-t-[5px] !border-double !border-t-ink' : ''
  return (
    <Row className={sum ? 'font-semibold' : undefined}>
      <RowHead className={edge}>{row.name}</RowHead>
      <Cell className={edge}>
        <svg aria-hidden="true" width="120" height="16" className="block">
          <rect
            x={row.watts < 0 ? 46 - Math.min(46, length) : 46}
            y="3"
            width={Math.min(row.watts < 0 ? 46 : 74, length)}
            height="10"
            className={row.watts < 0 ? 'fill-rule' : 'fill-ink'}
          />
          <path d="M46 0V16" className="stroke-ink" />
        </svg>
      </Cell>
      <Cell numeric className={edge}>
        {row.value}
      </Cell>
    </Row>
  )
}

function summaryOf(reading: ReturnType<typeof ledgerAt>, time: string): string {
  const parts = reading.accounts.map((row) => `${row.name.toLowerCase()} ${row.value}\u00a0W`)
  return `Heat balance at ${time}: ${parts.join(', ')}; stored ${reading.storage.value}\u00a0W.`
}
