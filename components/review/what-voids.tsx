import { Section } from '@/components/ui/section'

const KEEPS = [
  'Who drives, telephone numbers, notes',
  'A new run on newer air whose verdict is no worse',
  'An answer to a condition',
]
const VOIDS = [
  'A crate, an opening, bedding, an animal or its mass changed',
  'A leg, a time, a place, a carrier, a set-point or a stop changed',
  'A run on newer air with a worse verdict, or past what an override was signed for',
]

/** What a later change does to a signature, before it is given. */
export function WhatVoids() {
  return (
    <Section id="later" title="What a later change does">
      <div className="grid border-y-2 border-ink bg-sheet desk:grid-cols-2 desk:divide-x desk:divide-rule">
        <Part title="Keeps your approval" lines={KEEPS} />
        <Part title="Voids it, and says so" lines={VOIDS} />
      </div>
      <p className="mt-1.5 text-small text-mute">Under way nothing is blocked: a deviation is recorded.</p>
    </Section>
  )
}

function Part({ title, lines }: { title: string; lines: readonly string[] }) {
  return (
    <div className="px-3 py-2">
      <h3 className="text-sub">{title}</h3>
      <ul className="mt-1 list-none divide-y divide-hair">
        {lines.map((line) => (
          <li key={line} className="py-1.5 text-small">
            {line}
          </li>
        ))}
      </ul>
    </div>
  )
}
