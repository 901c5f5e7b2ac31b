import { BoxedFacts, Fact } from '@/components/ui/boxed-facts'
import { Mark } from '@/components/ui/mark'
import { Stamp } from '@/components/ui/stamp'
import { Temperature } from '@/components/ui/temperature'
import { dayTime, duration } from '@/lib/views/format'
import type { ReviewView } from '@/lib/views/review'
import type { AnimalView } from '@/lib/views/sheet'

/** Which crate, which animals, which journey, and the verdict with this set-up. */
export function ReviewHead({ view }: { view: ReviewView }) {
  const { chosen, sheet } = view
  return (
    <BoxedFacts
      columns="auto minmax(9rem,1fr) minmax(9rem,1fr) minmax(15rem,1.6fr)"
      className="print:grid-cols-2!"
    >
      <Fact caption="Crate" whole>
        <Mark size="l">{chosen.mark}</Mark>
      </Fact>
      <Fact caption={chosen.animals.length === 1 ? 'Animal' : 'Animals'} whole>
        {chosen.animals.length === 0 && 'none'}
        {chosen.animals.map((animal) => (
          <span key={animal.animalId} className="block">
            <b>{animal.name}</b>, {animal.describes}
            {healthLines(animal).map((line) => (
              <span key={line} className="block text-small text-mute">
                {line}
              </span>
            ))}
          </span>
        ))}
      </Fact>
      <Fact caption="Journey" whole>
        {sheet.legs[0]?.fromPlace} to {sheet.legs.at(-1)?.toPlace}
        <span className="block text-small text-mute">
          leaves {dayTime(sheet.leaves.ms, sheet.leaves.zone)}, {duration(sheet.journeyMin)}
        </span>
      </Fact>
      <Fact caption={`Verdict with this set-up, revision ${sheet.revision}`} whole>
        <span className="mt-0.5 flex flex-wrap items-center gap-x-3 gap-y-1">
          <Stamp {...chosen.stamp} size="m" />
          <span className="min-w-[9rem] flex-1">
            {chosen.animals.map((animal) => (
              <span key={animal.animalId} className="block">
                <b>{animal.decidedWords}</b>
                <span className="block text-small text-mute">
                  {animal.margin.bodyC !== null && (
                    <>
                      Body <Temperature c={animal.margin.bodyC} kind="body-margin" />.{' '}
                    </>
                  )}
                  {animal.trackWords}
                </span>
              </span>
            ))}
          </span>
        </span>
      </Fact>
    </BoxedFacts>
  )
}

/** What a vet asks of the animal before looking at figures. */
function healthLines({ flagWords, mannerWords, medicines, examinedWords }: AnimalView): string[] {
  return [
    flagWords === 'None' ? '' : flagWords,
    mannerWords,
    medicines === '' ? '' : `Medicines: ${medicines}`,
    examinedWords === '' ? 'Last examination not given' : `Last examined ${examinedWords}`,
  ].filter(Boolean)
}
