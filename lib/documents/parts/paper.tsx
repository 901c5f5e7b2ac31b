import { Page, Path, Svg, View } from '@react-pdf/renderer'
import type { ReactNode } from 'react'
import { INK, Mark, px, typeset, Words } from './words'
import { Text } from '@react-pdf/renderer'

const PAGE_WIDTH = 794
/** Sheets are planned, so the renderer need not look for places to break them; it would lay each out twice. */
const PAGE_HEIGHT_PT = 841.89
const BINDING = 68
const OUTER = 30
/** Room for what is printed, in pixels. */
export const CONTENT_WIDTH = PAGE_WIDTH - BINDING - OUTER
const CONTENT_BOTTOM = 1079
const TOP = 34

export interface PaperProps {
  mark: string
  title: string
  /** Under the title on sheet 1; part of the title on the others. */
  revisionWords: string
  revision: number
  edgeWords: string
  code: string
  madeWords: string
  sheet: number
  sheets: number
  children: ReactNode
}

/** One sheet of A4: binding margin with punch marks, designation on the edge, head, and foot with sheet n of m. */
export function Paper(props: PaperProps) {
  const { mark, title, revision, sheet, sheets, code, madeWords, edgeWords, children } = props
  return (
    <Page
      size="A4"
      wrap={false}
      style={{ minHeight: PAGE_HEIGHT_PT, backgroundColor: '#FFFFFF', color: INK.ink }}
    >
      <Edge words={edgeWords} />
      <View style={{ position: 'absolute', top: px(TOP), left: px(BINDING), width: px(CONTENT_WIDTH) }}>
        {sheet === 1 ? <FirstHead {...props} /> : <NextHead {...props} />}
        {children}
      </View>
      <View style={foot}>
        <Words
          size={10}
          line={13}
        >{`${mark}, ${title.toLowerCase()}, revision ${revision}. Sheet ${sheet} of ${sheets}`}</Words>
        <Words size={10} line={13}>
          Document code <Text style={typeset(10, 13, 600, 'fig')}>{code}</Text>. Made {madeWords}
        </Words>
      </View>
    </Page>
  )
}

const foot = {
  position: 'absolute',
  left: px(BINDING),
  width: px(CONTENT_WIDTH),
  bottom: px(22.7),
  flexDirection: 'row',
  justifyContent: 'space-between',
  borderTopWidth: px(0.75),
  borderTopColor: INK.ink,
  paddingTop: px(3),
} as const

/** Height of the head with its rule, pixels. */
const HEAD_HEIGHT = { first: 68, next: 55 } as const

/** Room under the head of a sheet, pixels. */
export function roomOn(sheet: number): number {
  return CONTENT_BOTTOM - TOP - (sheet === 1 ? HEAD_HEIGHT.first : HEAD_HEIGHT.next)
}

function FirstHead({ mark, title, revisionWords, code, madeWords }: PaperProps) {
  return (
    <View style={{ ...head, height: px(HEAD_HEIGHT.first) }}>
      <Mark size={52} line={46} style={{ marginRight: px(14) }}>
        {mark}
      </Mark>
      <View style={{ flexGrow: 1 }}>
        <Words face="head" weight={700} size={22} line={25}>
          {title}
        </Words>
        <Words size={12} line={15}>
          {revisionWords}
        </Words>
      </View>
      <View style={{ alignItems: 'flex-end' }}>
        <Maker size={15} />
        <Code code={code} />
        <Words size={11} line={14}>
          Made {madeWords}
        </Words>
      </View>
    </View>
  )
}

function NextHead({ mark, title, revision, code }: PaperProps) {
  return (
    <View style={{ ...head, height: px(HEAD_HEIGHT.next) }}>
      <Mark size={30} line={28} style={{ marginRight: px(14) }}>
        {mark}
      </Mark>
      <Words
        face="head"
        weight={700}
        size={16}
        line={20}
        style={{ flexGrow: 1 }}
      >{`${title}, revision ${revision}`}</Words>
      <View style={{ alignItems: 'flex-end' }}>
        <Maker size={13} />
        <Code code={code} />
      </View>
    </View>
  )
}

const head = {
  flexDirection: 'row',
  alignItems: 'flex-end',
  borderBottomWidth: px(4),
  borderBottomColor: INK.ink,
  paddingBottom: px(5),
} as const

function Code({ code }: { code: string }) {
  return (
    <Words size={11} line={14}>
      Document code <Text style={typeset(11, 14, 600, 'fig')}>{code}</Text>
    </Words>
  )
}

/** The slat mark and the name. */
function Maker({ size }: { size: number }) {
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', marginBottom: px(3) }}>
      <Svg viewBox="0 0 26 24" style={{ width: px(18), height: px(17), marginRight: px(6) }}>
        <Path d="M0 0h26v6H0z M0 18h26v6H0z" fill={INK.ink} />
        <Path
          d="M0 9h26v6H0z M5.5 10.2a1.8 1.8 0 1 0 0 3.6a1.8 1.8 0 0 0 0-3.6z M13 10.2a1.8 1.8 0 1 0 0 3.6a1.8 1.8 0 0 0 0-3.6z M20.5 10.2a1.8 1.8 0 1 0 0 3.6a1.8 1.8 0 0 0 0-3.6z"
          fill={INK.ink}
          fillRule="evenodd"
        />
      </Svg>
      <Mark size={size} line={size + 1}>
        STEADFOLD
      </Mark>
    </View>
  )
}

const PUNCH_MM = [105.5, 185.5]
const mm = (value: number) => (value / 25.4) * 72

function Edge({ words }: { words: string }) {
  return (
    <>
      {PUNCH_MM.map((top) => (
        <View
          key={top}
          style={{
            position: 'absolute',
            left: mm(6.5),
            top: mm(top),
            width: mm(6),
            height: mm(6),
            borderRadius: mm(3),
            borderWidth: px(1),
            borderColor: '#777777',
          }}
        />
      ))}
      <View style={{ position: 'absolute', left: px(19), top: px(38), width: px(18), height: px(480) }}>
        <View
          style={{
            position: 'absolute',
            left: px(-231),
            top: px(231),
            width: px(480),
            height: px(18),
            transform: 'rotate(-90deg)',
            alignItems: 'flex-end',
          }}
        >
          <Words face="head" weight={700} size={13} line={18}>
            {words}
          </Words>
        </View>
      </View>
    </>
  )
}

/** A section's heading with a remark beside it. */
export function Heading({
  children,
  remark = '',
  top = 7,
}: {
  children: string
  remark?: string
  top?: number
}) {
  return (
    <View
      style={{
        flexDirection: 'row',
        alignItems: 'flex-end',
        marginTop: px(top),
        marginBottom: px(3),
      }}
    >
      <Words face="head" weight={700} size={14} line={18}>
        {children}
      </Words>
      {remark === '' ? null : (
        <Words size={10.5} line={13} style={{ marginLeft: px(10), marginBottom: px(1.5) }}>
          {remark}
        </Words>
      )}
    </View>
  )
}
