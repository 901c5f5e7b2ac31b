'use client'

import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { BoxedFacts, Fact } from '@/components/ui/boxed-facts'
import type { Plan } from '@/lib/schemas/plan'
import { localTime } from '@/lib/views/format'
import { fieldWords, valueWords } from './field-words'
import type { NamesInPlan } from './field-words'
import type { MergedPlan } from './merge-plans'

export interface OpenConflict {
  merged: MergedPlan
  saved: { by: string; atMs: number }
  /** Paths already decided. */
  picked: readonly string[]
}

/** Two people saved: both versions of each field that differs, side by side. The person picks; nothing is lost. */
export function PlanConflictBox({
  conflict,
  plan,
  names,
  zone,
  onPick,
}: {
  conflict: OpenConflict
  plan: Plan
  names: NamesInPlan
  zone: string
  onPick: (path: string, value: unknown) => void
}) {
  const { merged, saved, picked } = conflict
  const open = merged.conflicts.filter(({ path }) => !picked.includes(path))
  const who = saved.by === '' ? 'Somebody' : saved.by
  return (
    <Notice role="alert" title={`Save refused: ${who} saved this plan at ${localTime(saved.atMs, zone)}`}>
      <p>
        Nothing of theirs or yours is lost.{' '}
        {open.length === 0
          ? 'Every difference is decided: save again to keep the plan as it stands now.'
          : `${open.length === 1 ? 'One field has' : `${open.length} fields have`} two values: pick one for each, then save again.`}
      </p>
      <ul className="mt-2 flex list-none flex-col gap-3">
        {open.map(({ path, mine, theirs }) => (
          <li key={path}>
            <h3 className="mb-1 text-body font-semibold">{fieldWords(plan, path) || 'The plan'}</h3>
            <BoxedFacts columns="1fr 1fr" className="border">
              <Fact caption={`${who}, ${localTime(saved.atMs, zone)}`}>
                <Value
                  words={valueWords(path, theirs, names)}
                  onPick={() => onPick(path, theirs)}
                  whose="theirs"
                />
              </Fact>
              <Fact caption="You, not saved">
                <Value words={valueWords(path, mine, names)} onPick={() => onPick(path, mine)} whose="mine" />
              </Fact>
            </BoxedFacts>
          </li>
        ))}
      </ul>
      {merged.taken.length > 0 && (
        <details className="mt-2 text-small">
          <summary className="link">
            {merged.taken.length === 1 ? 'One thing' : `${merged.taken.length} things`} they changed and you
            did not: taken over
          </summary>
          <ul className="mt-1 list-none">
            {merged.taken.map(({ path, before, after }) => (
              <li key={path} className="border-t border-hair py-1">
                <b>{fieldWords(plan, path) || 'The plan'}</b>: {valueWords(path, before, names)}, now{' '}
                {valueWords(path, after, names)}
              </li>
            ))}
          </ul>
        </details>
      )}
    </Notice>
  )
}

function Value({ words, whose, onPick }: { words: string; whose: 'mine' | 'theirs'; onPick: () => void }) {
  return (
    <span className="flex flex-wrap items-center justify-between gap-2 py-1">
      <b>{words}</b>
      <Button onClick={onPick}>{whose === 'mine' ? 'Keep mine' : 'Keep theirs'}</Button>
    </span>
  )
}
