import type { Stamp } from '@/lib/views/sheet'

export interface LetterHead {
  /** "2433"; empty where a letter speaks of no consignment. */
  mark: string
  /** "Manifest, revision 5" */
  title: string
  /** "Glasgow to Valletta, 3 animals" */
  under: string
  firm: string
  /** Stands in the list of mails beside the subject. */
  preview: string
}

export type LetterPart =
  | { kind: 'stamp'; stamp: Stamp }
  | { kind: 'paragraph'; bold?: string; text: string; after?: string }
  | { kind: 'links'; links: { label: string; url: string; first: boolean }[] }
  | { kind: 'heading'; text: string }
  | { kind: 'facts'; rows: { label: string; lines: string[] }[] }
  | { kind: 'numbered'; rows: { number: number; text: string; under: string }[] }
  | { kind: 'table'; heads: LetterColumn[]; rows: LetterCell[][] }
  | { kind: 'note'; text: string }

export interface LetterColumn {
  head: string
  right?: boolean
}

export interface LetterCell {
  text: string
  under?: string
  /** Set in the stencil face. */
  mark?: boolean
  bold?: boolean
  /** Drawn in its verdict's frame. */
  verdict?: 'go' | 'conditional' | 'no-go'
}
