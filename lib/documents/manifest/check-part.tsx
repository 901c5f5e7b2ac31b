import { Path, Svg, View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { CONTENT_WIDTH } from '@/lib/documents/parts/paper'
import { PaperPicture } from '@/lib/documents/parts/picture'
import { qrPicture } from '@/lib/documents/parts/qr'
import { Bold, INK, px, Words } from '@/lib/documents/parts/words'
import { HashLine } from '@/lib/documents/sheet/speaks-of'
import type { ManifestView } from '@/lib/views/manifest'
import { madeWords, plainDate } from '@/lib/documents/parts/made-words'
import { signature } from './signature'

/** 31 mm: a code is read from 30 mm. */
const QR = 118
const LABEL = 96
const TEXT = CONTENT_WIDTH - QR - 18 - LABEL - 4
const CHECK =
  'Scan the square, or put the document code or this PDF on the verification page. It says whether the paper is current, superseded or void, and shows no names.'

/** How to check the paper, what it speaks of, and the place of the digital signature; they stay together. */
export function checkPart(view: ManifestView): FixedBlock {
  const rows: [string, string][] = [
    ['Check this paper', CHECK],
    ['Revision', view.releasedWords],
    ['Assessed', view.assessedWords],
  ]
  const lines = rows.reduce((sum, [, text]) => sum + lineCount(text, 'text', 400, 11, TEXT), 0)
  const facts = Math.max(QR + 4, lines * 14 + rows.length * 3 + 2 * 16)
  const words = signatureWords(view)
  const place = Math.max(
    82,
    18 + 14 * lineCount(`The digital signature stands here. ${words}`, 'text', 400, 11, SIGN_TEXT),
  )
  return {
    height: 10 + facts + 10 + place + 22,
    element: (
      <View key="check">
        <View style={{ flexDirection: 'row', marginTop: px(10), height: px(facts) }}>
          <View style={{ width: px(QR), marginRight: px(18) }}>
            <PaperPicture picture={qrPicture(view.verifyUrl, QR)} />
          </View>
          <View style={{ width: px(CONTENT_WIDTH - QR - 18) }}>
            {rows.map(([label, text]) => (
              <View key={label} style={{ flexDirection: 'row', marginBottom: px(3) }}>
                <Words size={11} line={14} style={{ width: px(LABEL), color: INK.mute }}>
                  {label}
                </Words>
                <Words size={11} line={14} style={{ width: px(TEXT) }}>
                  {text}
                </Words>
              </View>
            ))}
            <HashLine label="Plan hash" hash={view.planHash} labelWidth={LABEL} perLine={8} />
            <HashLine label="Input hash" hash={view.inputHash} labelWidth={LABEL} perLine={8} />
          </View>
        </View>
        <SignaturePlace view={view} words={words} height={place} />
        <Words size={10.5} line={13} style={{ marginTop: px(8) }}>
          A decision aid. It takes the place of no veterinarian, no acceptance rule of a carrier and no law of
          the countries crossed.
        </Words>
      </View>
    ),
  }
}

const SIGN_NAME = 236
const SIGN_TEXT = CONTENT_WIDTH - SIGN_NAME - 28 - 18

function signatureWords({ seal }: ManifestView): string {
  const trust = seal.selfIssued
    ? ' The firm issued it itself: a reader trusts it once its root is installed.'
    : ''
  return `It covers every byte of this file and is made with the certificate of ${seal.subject}. A PDF reader that checks signatures shows it.${trust} The words here are not the signature, and a print of them proves nothing: scan the square.`
}

/** Four corner marks and no frame: a closed frame would read as a stamp. */
function SignaturePlace({ view, words, height }: { view: ManifestView; words: string; height: number }) {
  const { seal, made } = view
  const serial = seal.serial.split(' ').slice(-4).join(' ')
  return (
    <View
      style={{
        marginTop: px(10),
        height: px(height),
        flexDirection: 'row',
        alignItems: 'center',
        paddingHorizontal: px(14),
      }}
    >
      <Corners width={CONTENT_WIDTH} height={height} />
      <Words size={11} line={14} style={{ width: px(SIGN_TEXT), marginRight: px(18) }}>
        <Bold>The digital signature stands here.</Bold> {words}
      </Words>
      <View style={{ width: px(SIGN_NAME) }}>
        <Words face="head" weight={600} size={19} line={24} style={signature}>
          {seal.subject}
        </Words>
        <View style={{ borderBottomWidth: px(0.75), borderBottomColor: INK.rule, marginBottom: px(4) }} />
        <Words size={11} line={14}>
          {`Signed ${madeWords(made)}`}
        </Words>
        <Words size={11} line={14}>
          {`Certificate … ${serial}, valid to ${plainDate(seal.validTo.ms, seal.validTo.zone)}`}
        </Words>
      </View>
    </View>
  )
}

function Corners({ width, height }: { width: number; height: number }) {
  const long = 16
  const [right, foot] = [width - 1, height - 1]
  const d = [
    `M1 ${long}V1H${long}`,
    `M${right - long} 1H${right}V${long}`,
    `M${right} ${foot - long}V${foot}H${right - long}`,
    `M${long} ${foot}H1V${foot - long}`,
  ].join('')
  return (
    <Svg
      viewBox={`0 0 ${width} ${height}`}
      style={{ position: 'absolute', left: 0, top: 0, width: px(width), height: px(height) }}
    >
      <Path d={d} fill="none" stroke={INK.ink} strokeWidth={2} />
    </Svg>
  )
}
