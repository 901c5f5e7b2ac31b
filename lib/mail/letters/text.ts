import type { Stamp } from '@/lib/views/sheet'
import { counted } from '@/lib/views/format'
import type { LetterCell, LetterColumn, LetterHead, LetterPart } from './parts'

/** The letter as plain text: the same parts in the same order. */
export function letterText(head: LetterHead, parts: LetterPart[]): string {
  const top = [`STEADFOLD. ${head.firm}`, '', [head.mark, head.title].filter(Boolean).join(', '), head.under]
  return `${[...top, ...parts.flatMap(lines)].join('\n').replaceAll('\u00a0', ' ').trim()}\n`
}

/** "GO WITH CONDITIONS, 3 conditions" */
export function stampWords({ verdict, conditions, outOfDate }: Stamp): string {
  if (outOfDate) return 'OUT OF DATE'
  switch (verdict) {
    case 'go':
      return 'GO'
    case 'no-go':
      return 'NO-GO'
    case 'none':
      return 'Not assessed'
    case 'conditional':
      return conditions === 0
        ? 'GO WITH CONDITIONS'
        : `GO WITH CONDITIONS, ${counted(conditions, 'condition')}`
  }
}

function lines(part: LetterPart): string[] {
  switch (part.kind) {
    case 'stamp':
      return ['', stampWords(part.stamp)]
    case 'paragraph':
      return ['', [part.bold, part.text, part.after].filter(Boolean).join(' ')]
    case 'links':
      return ['', ...part.links.map(({ label, url }) => `${label}: ${url}`)]
    case 'heading':
      return ['', part.text, '-'.repeat(part.text.length)]
    case 'facts':
      return part.rows.map(({ label, lines: facts }) => `${label}: ${facts.join('; ')}`)
    case 'numbered':
      return part.rows.flatMap(({ number, text, under }) => [
        `${number}. ${text}`,
        ...(under === '' ? [] : [`   ${under}`]),
      ])
    case 'table':
      return part.rows.map((cells) => rowInWords(part.heads, cells))
    case 'note':
      return ['', part.text]
  }
}

/** A row as a sentence: a table of spaces falls apart in every mail reader but one. */
function rowInWords(heads: LetterColumn[], cells: LetterCell[]): string {
  const said = cells.map(({ text, under, verdict }, index) => {
    const words = [text, under ?? '', verdict === undefined ? '' : VERDICT[verdict]]
      .filter(Boolean)
      .join(', ')
    return index === 0 ? words : `${heads[index]?.head ?? ''}: ${words}`
  })
  return `- ${said.join('; ')}`
}

const VERDICT = { go: 'GO', conditional: 'GO WITH CONDITIONS', 'no-go': 'NO-GO' } as const
