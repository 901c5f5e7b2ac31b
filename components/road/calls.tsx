import { buttonClass } from '@/components/ui/button'
import { join } from '@/components/ui/join'
import type { CallView } from '@/lib/views/manifest'

/** The two numbers one needs at once, as wide as the phone. */
export function CallBar({ calls }: { calls: readonly CallView[] }) {
  const [first, second] = calls.filter((call) => call.telephone !== '')
  if (!first) return null
  return (
    <div className="no-print flex border-y-2 border-ink bg-sheet">
      <a
        href={telHref(first.telephone)}
        className={join(buttonClass({ first: true, size: 'phone' }), 'min-h-15 flex-1 !border-0')}
      >
        Ring {first.who}
      </a>
      {second && (
        <a
          href={telHref(second.telephone)}
          className={join(buttonClass({ size: 'phone' }), 'min-h-15 flex-1 !border-0 !border-l !border-hand')}
        >
          Ring {second.who}
        </a>
      )}
    </div>
  )
}

/** Everybody to ring, in order. */
export function CallList({ calls }: { calls: readonly CallView[] }) {
  return (
    <section aria-labelledby="calls" className="no-print border-t-2 border-ink bg-sheet pt-3">
      <h2 id="calls" className="px-4 text-section">
        Ring in this order
      </h2>
      <p className="px-4 text-caption text-mute">5 min without an answer, ring the next</p>
      <ol className="mt-1.5 list-none">
        {calls.map((call) => (
          <li key={call.number} className="border-t border-rule">
            <a
              href={telHref(call.telephone)}
              className="grid min-h-16 grid-cols-[34px_1fr] items-center px-4 py-2.5 no-underline"
            >
              <b className="row-span-2 font-head text-mark-m font-bold text-ink">{call.number}</b>
              <span className="fig text-section font-semibold text-hand underline decoration-1 underline-offset-2">
                {call.telephone || 'no number kept'}
              </span>
              <span className="text-small text-ink">
                {[call.who, call.purpose].filter(Boolean).join(', ')}
              </span>
            </a>
          </li>
        ))}
      </ol>
    </section>
  )
}

function telHref(telephone: string): string {
  return `tel:${telephone.replace(/[^+\d]/g, '')}`
}
