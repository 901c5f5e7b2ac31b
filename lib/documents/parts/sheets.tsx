import { Document } from '@react-pdf/renderer'
import { type Block, flow } from '@/lib/documents/flow'
import { Paper, roomOn } from '@/lib/documents/parts/paper'
import { madeWords } from '@/lib/documents/parts/made-words'
import type { Moment } from '@/lib/views/sheet'

/** What the head and the foot of every sheet of a document say. */
export interface Titled {
  title: string
  mark: string
  revision: number
  revisionWords: string
  edgeWords: string
  /** Printed code, or "none" where nothing is issued. */
  code: string
  firmName: string
  made: Moment
}

/** Blocks laid out on numbered sheets, and how many were planned. `slack` under 1 plans less on each sheet. */
export function sheetsOf(titled: Titled, blocks: Block[], slack: number) {
  const sheets = flow(blocks, (sheet) => roomOn(sheet) * slack)
  const { title, mark, revision, revisionWords, edgeWords, code, firmName, made } = titled
  const document = (
    <Document
      title={`${mark} ${title.toLowerCase()}, revision ${revision}`}
      author={firmName}
      subject={title}
      keywords={code === 'none' ? '' : `Document code ${code}`}
      creator="Steadfold"
      producer="Steadfold"
      language="en-GB"
    >
      {sheets.map((children, index) => (
        <Paper
          key={index}
          mark={mark}
          title={title}
          revision={revision}
          revisionWords={revisionWords}
          edgeWords={edgeWords}
          code={code}
          madeWords={madeWords(made)}
          sheet={index + 1}
          sheets={sheets.length}
        >
          {children}
        </Paper>
      ))}
    </Document>
  )
  return { document, sheets: sheets.length }
}
