'use client'

import { useState } from 'react'
import type { ReactNode } from 'react'
import { useWidth } from '@/components/hooks/use-width'
import { TableToggle } from '@/components/ui/table-toggle'
import { SCREENS } from '@/lib/tokens'
import { narrowestMinute } from '@/lib/views/charts/reading'
import type { CorridorInput } from '@/lib/views/charts/types'
import { CorridorNarrow } from './corridor-narrow'
import { CorridorTable } from './corridor-table'
import { CorridorWide } from './corridor-wide'

/** What the server draws for, until the browser has measured. */
const ASSUMED_WIDTH = 1232

/**
 * The corridor of one animal: body temperature between its limits over the whole journey. Drawn for the width it gets;
 * under 760 px one leg at a time. `minute` and `onMinute` let a ledger beside it share the reading line.
 */
export function Corridor({
  input,
  title = 'Corridor',
  words,
  minute,
  onMinute,
  acts,
}: {
  input: CorridorInput
  title?: ReactNode
  words?: ReactNode
  minute?: number
  onMinute?: (minute: number) => void
  acts?: ReactNode
}) {
  const narrowestMin = narrowestMinute(input)
  const [own, setOwn] = useState(narrowestMin)
  const [box, measured] = useWidth<HTMLDivElement>()
  const shared = {
    input,
    minute: Math.min(input.endMin, Math.max(0, minute ?? own)),
    narrowestMin,
    onMinute: onMinute ?? setOwn,
  }
  const width = measured ?? ASSUMED_WIDTH
  const narrow = measured !== null && measured < SCREENS.desk - 48
  return (
    <TableToggle
      title={title}
      words={
        words ??
        `Body temperature of ${input.animalName}, true time scale. Hatching begins at the alarm limit; the thick line in it is the critical limit.`
      }
      acts={acts}
      picture={
        <div ref={box} className="desk:overflow-hidden">
          {/* Until it is measured, a phone would get the desk's picture for a moment: it gets none. */}
          <div className={measured === null ? 'max-desk:hidden' : undefined}>
            {narrow ? (
              <CorridorNarrow {...shared} width={width} />
            ) : (
              <CorridorWide {...shared} width={width} />
            )}
          </div>
        </div>
      }
      table={<CorridorTable input={input} />}
    />
  )
}
