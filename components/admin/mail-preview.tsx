import type { ReactNode } from 'react'
import { Sheet } from '@/components/ui/section'
import { dayTime } from '@/lib/views/format'
import type { MailDetail } from '@/lib/views/administration'
import { MAIL_STATE_WORDS, needsDecision } from './mail-state'

/** One mail as it was written, and what is known of its way. */
export function MailPreview({ mail, children }: { mail: MailDetail; children?: ReactNode }) {
  return (
    <Sheet>
      <section>
        <h2 className="text-section">
          {mail.state === 'uncertain' ? 'Did it go?' : MAIL_STATE_WORDS[mail.state]}
        </h2>
        {mail.state === 'uncertain' && (
          <p className="mt-1">
            The line broke before the server said whether it took the letter. It may lie in the box, or not.
            Nobody can know here: ask, then decide.
          </p>
        )}
        <dl className="mt-2 grid grid-cols-[auto_1fr] gap-x-4 gap-y-0.5 text-small">
          <Row name="Mail">
            <b>{mail.subject}</b>
          </Row>
          <Row name="To">{mail.to}</Row>
          <Row name="Written">{dayTime(mail.written.ms, mail.written.zone)}</Row>
          <Row name="Tries">{mail.attempts}</Row>
          <Row name="Last word">{mail.lastWord || 'none'}</Row>
          <Row name="Number">
            <span className="fig break-all text-caption">{mail.messageId}</span>
          </Row>
          {mail.attachments.map((attachment) => (
            <Row key={attachment.documentId} name="With">
              <a href={`/api/documents/${attachment.documentId}/pdf`}>{attachment.words}</a>
            </Row>
          ))}
        </dl>
      </section>
      {needsDecision(mail.state) && children && <section>{children}</section>}
      <section>
        <h3 className="text-sub">The letter</h3>
        <pre
          tabIndex={0}
          aria-label="Text of the letter"
          className="mt-1 max-h-[28rem] overflow-auto whitespace-pre-wrap border border-rule bg-ground px-3 py-2 font-text text-small"
        >
          {mail.text}
        </pre>
      </section>
    </Sheet>
  )
}

function Row({ name, children }: { name: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-mute">{name}</dt>
      <dd className="m-0 min-w-0 break-words">{children}</dd>
    </>
  )
}
