import { join } from '@/components/ui/join'

type Facts = Record<string, unknown> | null

/** Before and after as boxed facts, one line a field; what differs is set in 600. */
export function AuditFacts({ before, after }: { before: Facts; after: Facts }) {
  return (
    <div className="grid border border-rule bg-sheet desk:grid-cols-2 desk:divide-x desk:divide-rule">
      <Side name="Before" facts={before} other={after} />
      <Side name="After" facts={after} other={before} />
    </div>
  )
}

function Side({ name, facts, other }: { name: string; facts: Facts; other: Facts }) {
  const fields = Object.entries(facts ?? {})
  return (
    <div className="min-w-0 px-3 py-2">
      <p className="text-caption text-mute">{name}</p>
      {fields.length === 0 && <p className="text-mute">nothing</p>}
      <dl className="fig text-small">
        {fields.map(([field, value]) => {
          const words = spell(value)
          const differs = other !== null && spell(other[field]) !== words
          return (
            <div
              key={field}
              className={join('grid grid-cols-[minmax(6rem,auto)_1fr] gap-x-3', differs && 'font-semibold')}
            >
              <dt className="text-mute">{field}</dt>
              <dd className="m-0 min-w-0 break-words">{words}</dd>
            </div>
          )
        })}
      </dl>
    </div>
  )
}

function spell(value: unknown): string {
  if (value === null || value === undefined) return 'none'
  return typeof value === 'object' ? JSON.stringify(value) : String(value)
}
