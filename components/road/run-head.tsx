import { Mark } from '@/components/ui/mark'
import type { ChecklistView } from '@/lib/views/checklist'

/** Which run this is: mark, revision, crates. */
export function RunHead({ view }: { view: ChecklistView }) {
  return (
    <div className="no-print mx-auto flex max-w-[430px] items-center gap-3 border-b border-rule bg-sheet px-4 py-2.5 desk:border-x">
      <Mark size="phone">{view.mark}</Mark>
      <p className="ml-auto text-right text-caption">
        {view.driverName}
        <span className="block">
          Revision {view.revision}, {view.crates.length === 1 ? 'crate' : 'crates'}{' '}
          <span className="crate text-mark-s">{view.crates.map((crate) => crate.letter).join(' ')}</span>
        </span>
      </p>
    </div>
  )
}
