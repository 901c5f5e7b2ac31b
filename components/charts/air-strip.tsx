'use client'

import { useMemo } from 'react'
import type { ReactNode } from 'react'
import { useWidth } from '@/components/hooks/use-width'
import { Cell, Head, Ledger, Row, RowHead } from '@/components/ui/ledger'
import { TableToggle } from '@/components/ui/table-toggle'
import { SCREENS } from '@/lib/tokens'
import { airPicture, airTable } from '@/lib/views/charts/air-picture'
import type { AirPictureInput } from '@/lib/views/charts/air-picture'
import { PictureSvg } from './picture'

/** Crate air, what lies outside, and the logger strip on a ruler of their own: where no body track is shown. */
export function AirStrip({
  input,
  title = 'Crate air',
  words,
}: {
  input: AirPictureInput
  title?: ReactNode
  words?: ReactNode
}) {
  const [box, measured] = useWidth<HTMLDivElement>()
  const narrow = measured !== null && measured < SCREENS.desk - 48
  const picture = useMemo(
    () => airPicture(input, { width: measured ?? 1232, size: narrow ? 15 : 12 }),
    [input, measured, narrow],
  )
  const { summary, rows } = airTable(input)
  return (
    <TableToggle
      title={title}
      words={words}
      picture={
        <div ref={box} className="overflow-hidden">
          <PictureSvg picture={picture} summary={summary} />
        </div>
      }
      table={
        <Ledger caption={summary}>
          <thead>
            <tr>
              <Head>Hour from</Head>
              <Head numeric>{input.extreme === 'hottest' ? 'Hottest' : 'Coldest'}</Head>
              <Head numeric>Outside</Head>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <Row key={row.key}>
                <RowHead>{row.time}</RowHead>
                <Cell numeric>{row.crate}</Cell>
                <Cell numeric>{row.outside}</Cell>
              </Row>
            ))}
          </tbody>
        </Ledger>
      }
    />
  )
}
