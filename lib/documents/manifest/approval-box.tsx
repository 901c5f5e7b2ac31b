import { Path, Rect, Svg, View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { plainDate } from '@/lib/documents/parts/made-words'
import { INK, px, Words } from '@/lib/documents/parts/words'
import { dayDateYear, localTime } from '@/lib/views/format'
import type { ManifestView } from '@/lib/views/manifest'
import type { ApprovalView } from '@/lib/views/sheet'
import { signature } from './signature'

const RECORD = 236
const STATEMENT = CONTENT_WIDTH - RECORD - 3 - 20
const NOT_FITNESS = 'This is not a certificate of fitness to travel.'

/** What a vet signed, one box for each signature; the record beside it was checked by an admin, never typed. */
export function approvalBoxes({ approvals }: ManifestView): FixedBlock[] {
  if (approvals.length === 0) {
    return [{ height: 28 + 30, newSheet: true, element: <NotSigned key="approval" /> }]
  }
  return approvals.map((approval, index) => ({
    newSheet: index === 0,
    height: boxHeight(approval) + (index === 0 ? 29 : 6),
    element: (
      <View key={`approval-${approval.vetName}-${index}`}>
        {index === 0 ? <Heading>Vet’s approval</Heading> : <View style={{ height: px(6) }} />}
        <ApprovalBox approval={approval} />
      </View>
    ),
  }))
}

function NotSigned() {
  return (
    <View>
      <Heading>Vet’s approval</Heading>
      <Words size={12.5} line={16.5} style={{ marginTop: px(4) }}>
        No vet has signed this consignment.
      </Words>
    </View>
  )
}

function textLines(text: string): number {
  return lineCount(text, 'text', 400, 12.5, STATEMENT)
}

function boxHeight({ statement, envelopeWords }: ApprovalView): number {
  const left =
    8 +
    16.5 * (textLines(statement) + 1 + (envelopeWords === '' ? 0 : textLines(envelopeWords) + 0.4)) +
    12 +
    2 * 18 +
    12
  return Math.max(122, left)
}

function ApprovalBox({ approval }: { approval: ApprovalView }) {
  const { statement, examined, envelopeWords } = approval
  return (
    <View
      style={{
        flexDirection: 'row',
        borderWidth: px(1.5),
        borderColor: INK.ink,
        height: px(boxHeight(approval)),
      }}
    >
      <View style={{ width: px(CONTENT_WIDTH - RECORD - 3), paddingHorizontal: px(10), paddingTop: px(7) }}>
        <Words size={12.5} line={16.5}>
          {statement}
        </Words>
        <Answer ticked={examined}>I have examined the animals.</Answer>
        <Answer ticked={!examined}>I have not examined the animals.</Answer>
        <Words size={12.5} line={16.5} weight={600} style={{ marginTop: px(7) }}>
          {NOT_FITNESS}
        </Words>
        {envelopeWords === '' ? null : (
          <Words size={12.5} line={16.5} style={{ marginTop: px(6) }}>
            {envelopeWords}
          </Words>
        )}
      </View>
      <View
        style={{
          width: px(RECORD),
          paddingHorizontal: px(10),
          paddingTop: px(8),
          borderLeftWidth: px(0.75),
          borderLeftColor: INK.rule,
        }}
      >
        <Record approval={approval} />
      </View>
    </View>
  )
}

function Answer({ ticked, children }: { ticked: boolean; children: string }) {
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', marginTop: px(4) }}>
      <Svg viewBox="0 0 14 14" style={{ width: px(14), height: px(14), marginRight: px(7) }}>
        <Rect x={0.75} y={1.75} width={11.5} height={11.5} fill="none" stroke={INK.ink} strokeWidth={1.5} />
        {ticked ? <Path d="M3 7.5L6 10.5L12.5 1.5" fill="none" stroke={INK.hand} strokeWidth={2.2} /> : null}
      </Svg>
      <Words size={12} line={15} weight={ticked ? 600 : 400}>
        {children}
      </Words>
    </View>
  )
}

function Record({ approval }: { approval: ApprovalView }) {
  const { vetName, registration, registrationCountry, registrationExpires, checkedWords, signedAt } = approval
  const expires = plainDate(Date.parse(`${registrationExpires}T00:00:00Z`), 'UTC')
  const lines = [
    `Registration ${registration}, ${registrationCountry}`,
    `Valid to ${expires}`,
    checkedWords,
    `Signed ${dayDateYear(signedAt.ms, signedAt.zone)}, ${localTime(signedAt.ms, signedAt.zone)}`,
  ]
  return (
    <View>
      <Words face="head" weight={600} size={19} line={24} style={signature}>
        {vetName}
      </Words>
      <View style={{ borderBottomWidth: px(0.75), borderBottomColor: INK.rule, marginBottom: px(5) }} />
      <Words size={12} line={15} weight={600}>
        {vetName}
      </Words>
      {lines.filter(Boolean).map((line, index) => (
        <Words key={index} size={11} line={14}>
          {line}
        </Words>
      ))}
    </View>
  )
}
