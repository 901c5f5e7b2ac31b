import { Cell, Head, Ledger, Row, RowHead } from '@/components/ui/ledger'
import { join } from '@/components/ui/join'
import { TemperatureChip } from '@/components/ui/temperature'
import { PatternSwatch } from '@/components/charts/pattern-swatch'
import { dayDate, hourMin, localTime } from '@/lib/views/format'
import type { AnimalView, LegView } from '@/lib/views/sheet'
import { LegCellFigures } from './margin-figures'

/** Every leg with what it leaves each animal: minutes and outside air first, then the limit that decides, then body. */
export function LegsTable({
  legs,
  animals,
  animalId = null,
  outOfDate,
}: {
  legs: readonly LegView[]
  animals: readonly AnimalView[]
  /** The animal in hand: on a phone it is the only one shown. */
  animalId?: string | null
  outOfDate: boolean
}) {
  return (
    <Ledger
      caption="Legs: in the frame minutes to spare, beside it outside air to spare; below the limit that decides, then body"
      folds
    >
      <thead>
        <tr>
          <Head>Leg</Head>
          <Head>Surroundings</Head>
          <Head>From, to</Head>
          <Head numeric>h:min</Head>
          <AnimalHeads animals={animals} />
          <Head>Conditions</Head>
        </tr>
      </thead>
      <tbody>
        {legs.map((leg) => (
          <Row key={leg.legId}>
            <RowHead className="font-head text-sub font-bold">{leg.ordinal}</RowHead>
            <Cell>
              <span className="flex items-start gap-2.5">
                <PatternSwatch pattern={leg.pattern} />
                <span>
                  {leg.title}
                  <span className="block text-small text-mute">{leg.airWords}</span>
                </span>
                {leg.airTempC !== null && (
                  <span className="fig ml-auto text-small">
                    <TemperatureChip c={leg.airTempC} />
                  </span>
                )}
              </span>
            </Cell>
            <Cell className="whitespace-nowrap text-small">
              <LegTimes leg={leg} />
            </Cell>
            <Cell className="max-desk:hidden!" numeric>
              {hourMin(leg.durationMin)}
            </Cell>
            {leg.cells.map((cell, column) => (
              <Cell
                key={cell.animalId}
                label={animalLabel(animals[column])}
                className={join(animalId !== null && cell.animalId !== animalId && 'max-desk:hidden!')}
              >
                <LegCellFigures cell={cell} outOfDate={outOfDate} />
              </Cell>
            ))}
            <Cell label="Conditions" className="fig text-small">
              {leg.conditionNumbers.join(', ')}
            </Cell>
          </Row>
        ))}
      </tbody>
    </Ledger>
  )
}

/** The same for a sheet of paper: three animals beside one another on A4; further ones in tables of their own. */
export function PaperLegs({
  legs,
  animals,
  outOfDate,
}: {
  legs: readonly LegView[]
  animals: readonly AnimalView[]
  outOfDate: boolean
}) {
  const groups = Array.from({ length: Math.ceil(animals.length / 3) }, (_, index) => index * 3)
  return groups.map((from) => (
    <div key={from} className="mb-2 text-small desk:[&_td]:!px-1.5 desk:[&_td]:!py-1 desk:[&_th]:!px-1.5">
      <Ledger caption="Legs" folds>
        <thead>
          <tr>
            <Head>Leg</Head>
            <Head className="min-w-[11.5rem]">Surroundings</Head>
            <Head>Starts, h:min</Head>
            <AnimalHeads animals={animals.slice(from, from + 3)} />
            <Head>Co.</Head>
          </tr>
        </thead>
        <tbody>
          {legs.map((leg) => (
            <tr key={leg.legId}>
              <RowHead className="font-head text-sub font-bold">{leg.ordinal}</RowHead>
              <Cell>
                <span className="flex items-start gap-1.5">
                  <PatternSwatch pattern={leg.pattern} width={26} height={14} />
                  <span className="leading-4">
                    {leg.title}
                    <span className="block text-caption">{leg.airWords}</span>
                  </span>
                </span>
              </Cell>
              <Cell label="Starts, h:min" className="whitespace-nowrap">
                {localTime(leg.start.ms, leg.start.zone)}
                <span className="block">{hourMin(leg.durationMin)}</span>
              </Cell>
              {leg.cells.slice(from, from + 3).map((cell, column) => (
                <Cell key={cell.animalId} label={animalLabel(animals[from + column])}>
                  <LegCellFigures cell={cell} outOfDate={outOfDate} />
                </Cell>
              ))}
              <Cell label="Conditions" className="fig max-w-10">
                {leg.conditionNumbers.join(' ')}
              </Cell>
            </tr>
          ))}
        </tbody>
      </Ledger>
    </div>
  ))
}

function animalLabel(animal: AnimalView | undefined): string | undefined {
  return animal && `${animal.crateLetter} ${animal.name}`
}

function AnimalHeads({ animals }: { animals: readonly AnimalView[] }) {
  return animals.map((animal) => (
    <Head key={animal.animalId}>
      <span className="crate mr-1.5 text-[1rem] text-ink">{animal.crateLetter}</span>
      {animal.name}
    </Head>
  ))
}

/** Start and end on the clock of each place; the day where it is another than the start's. */
function LegTimes({ leg: { start, end } }: { leg: LegView }) {
  const day = dayDate(start.ms, start.zone)
  const endDay = dayDate(end.ms, end.zone)
  return (
    <>
      <span className="block">
        {day} {localTime(start.ms, start.zone)}
      </span>
      <span className="block">
        {endDay === day ? '' : `${endDay} `}
        {localTime(end.ms, end.zone)}
      </span>
    </>
  )
}
