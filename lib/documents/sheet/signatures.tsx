import { View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { Bold, px, Words } from '@/lib/documents/parts/words'
import { dayDateYear, localTime } from '@/lib/views/format'
import type { ApprovalView } from '@/lib/views/sheet'

const SIZE = 11
const LINE = 14.5
const GAP = 4
const HEADING = 28

/** What vets signed, word for word: it names the crates and every finding overridden. Nothing where nobody signed. */
export function signatures(approvals: ApprovalView[]): FixedBlock[] {
  return approvals.map((approval, index) => {
    const bold = `${approval.crateMarks.join(', ')}.`
    const text = `${signerOf(approval)}: ${approval.statement}`
    const lines = lineCount(`${bold} ${text}`, 'text', 600, SIZE, CONTENT_WIDTH)
    return {
      height: (index === 0 ? HEADING : 0) + lines * LINE + GAP,
      element: (
        <View key={`signature-${index}`} style={{ paddingBottom: px(GAP) }}>
          {index === 0 ? <Heading>Vet’s approval</Heading> : null}
          <Words size={SIZE} line={LINE}>
            <Bold>{bold}</Bold> {text}
          </Words>
        </View>
      ),
    }
  })
}

function signerOf({
  vetName,
  registration,
  registrationCountry,
  signedAt: { ms, zone },
}: ApprovalView): string {
  return `${vetName}, registration ${registration}, ${registrationCountry}, ${dayDateYear(ms, zone)}, ${localTime(ms, zone)}`
}
