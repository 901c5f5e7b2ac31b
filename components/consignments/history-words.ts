import type { HistoryLine } from '@/lib/views/desk-page'

const VERB_WORDS: Record<string, string> = {
  'consignment.create': 'Began the consignment',
  'consignment.save': 'Saved the plan',
  'consignment.assess': 'Asked for an assessment',
  'assessment.record': 'Assessed',
  'assessment.fail': 'The assessment stopped',
  'consignment.submit': 'Sent it to the vet',
  'approval.approve': 'Signed',
  'approval.return': 'Returned it',
  'approval.withdraw': 'Withdrew an approval',
  'consignment.release': 'Asked for the release',
  'consignment.released': 'Released',
  'consignment.depart': 'Departed',
  'consignment.deliver': 'Delivered',
  'consignment.stop': 'Broke the journey off',
  'consignment.cancel': 'Cancelled',
  'consignment.confirm-air': 'Said that the air still holds',
  'consignment.confirm-condition': 'Wrote down an answer to a condition',
  'consignment.record-instruction': 'Wrote down an instruction',
  'consignment.acknowledge': 'Acknowledged',
  'consignment.ask-change': 'Asked for a change',
  'document.download': 'Opened a paper',
  'run.enter': 'Wrote an entry on the road',
  'run.hand-over': 'Wrote down a handover',
  'mail.sent': 'A mail was taken by its server',
  'mail.uncertain': 'A mail may not have arrived',
  'mail.failed': 'A mail could not be sent',
  'mail.resend': 'Had a mail sent again',
}

/** What a line of the audit trail says happened, in words: "Sent it to the vet", "Refused: released". */
export function verbWords({ verb, refused }: Pick<HistoryLine, 'verb' | 'refused'>): string {
  const plain = verb.replace(/\.refused$/, '')
  const words = VERB_WORDS[plain] ?? plain.replace('.', ', ').replaceAll('-', ' ')
  return refused ? `Refused: ${words.charAt(0).toLowerCase()}${words.slice(1)}` : words
}
