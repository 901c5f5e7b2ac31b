import { Stamp } from '@/components/ui/stamp'
import { Temperature } from '@/components/ui/temperature'
import type { AnimalView } from '@/lib/views/sheet'
import { minutesWords } from './margin-figures'

/** A box for each animal: letter, stamp, minutes and outside air large, then the limit and leg that decide. */
export function AnimalBoxes({ animals }: { animals: readonly AnimalView[] }) {
  return (
    <div className="grid grid-cols-1 gap-px border-2 border-ink bg-rule desk:grid-cols-[repeat(auto-fit,minmax(12rem,1fr))]">
      {animals.map((animal) => (
        <div key={animal.animalId} className="break-inside-avoid bg-sheet px-2.5 py-2">
          <div className="flex items-center gap-2">
            <span className="crate text-[1.75rem] leading-8">{animal.crateLetter}</span>
            <span className="min-w-0">
              <b className="block font-head">{animal.name}</b>
              <span className="block text-small">{animal.describes}</span>
            </span>
          </div>
          <div className="py-1.5">
            <Stamp {...animal.stamp} />
          </div>
          <p className="fig flex gap-4 text-section font-semibold">
            <span>{minutesWords(animal.margin)}</span>
            {animal.margin.outsideAirC !== null && (
              <Temperature c={animal.margin.outsideAirC} kind="air-margin" />
            )}
          </p>
          <p className="font-semibold">{animal.decidedWords}</p>
          <p className="text-small">
            {animal.margin.bodyC !== null && (
              <>
                Body <Temperature c={animal.margin.bodyC} kind="body-margin" />.{' '}
              </>
            )}
            {animal.trackWords}
          </p>
        </div>
      ))}
    </div>
  )
}
