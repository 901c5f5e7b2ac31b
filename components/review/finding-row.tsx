'use client'

import { useWatch } from 'react-hook-form'
import { TextArea } from '@/components/forms/text-input'
import { Tick } from '@/components/forms/ticks'
import { Cell } from '@/components/ui/ledger'
import { join } from '@/components/ui/join'
import type { FindingView } from '@/lib/views/sheet'
import { isBreach, whyNotOverridable } from './override-words'
import type { ReviewFormState } from './review-desk'

/** One finding: with a violet box where a vet may override it, and in words why not where nobody may. */
export function FindingRow({
  form,
  finding,
  index,
  closed,
}: {
  form: ReviewFormState
  finding: FindingView
  index: number
  closed: boolean
}) {
  const on = useWatch({ control: form.form.control, name: `overrides.${index}.on` }) === true
  const fixed = whyNotOverridable(finding, closed)
  const chosen = join(on && 'bg-handwash', on && '[&>td:first-child]:shadow-[inset_4px_0_0_var(--hand)]')
  return (
    <>
      <tr className={chosen}>
        <Cell className="align-top">
          {fixed ? (
            <span className="text-small">
              <b>{fixed.bold}</b> <span className="text-mute">{fixed.more}</span>
            </span>
          ) : (
            <Tick
              {...form.field(`overrides.${index}.on`)}
              label={
                <>
                  {finding.status === 'overridden'
                    ? 'I override this finding too'
                    : 'I override this finding'}
                  <span className="sr-only">: {finding.asked}</span>
                </>
              }
              disabled={closed}
            />
          )}
        </Cell>
        <Cell label="Basis" className="align-top">
          {finding.basisWords}
        </Cell>
        <Cell className="align-top">
          <b>{finding.asked}</b>
          <span className="block text-small text-mute">
            {[finding.whoLegWords, finding.citation, finding.sourceWords].filter(Boolean).join('; ')}
          </span>
        </Cell>
        <Cell label="Plan gives" className="whitespace-nowrap align-top">
          {finding.givesWords}
        </Cell>
        <Cell label="To spare" numeric className={join('align-top', isBreach(finding) && 'font-semibold')}>
          {finding.spareWords.split(', ').map((part) => (
            <span key={part} className="block">
              {part}
            </span>
          ))}
        </Cell>
      </tr>
      {on && (
        <tr className={chosen}>
          <td className="px-2.5 pb-2 text-right align-top">
            <span className="font-semibold">Why</span>
          </td>
          <td colSpan={4} className="px-2.5 pb-2.5">
            <TextArea
              {...form.field(`overrides.${index}.reason`)}
              label={<span className="sr-only">Why you override: {finding.asked}</span>}
              rows={2}
              maxLength={1000}
            />
          </td>
        </tr>
      )}
    </>
  )
}
