import { type FieldIssue, SteadfoldError } from '@/lib/errors'
import { notOnPaperWords } from '@/lib/schemas/paper-letters'
import type { FaceName } from '@/lib/tokens'
import { missingLetters } from './fonts'

/** Fields set in another face than the text's. A signature is set in the head face. */
const FACE_OF_FIELD: Record<string, FaceName[]> = {
  vetName: ['text', 'head'],
  title: ['text', 'head'],
  headline: ['text'],
  mark: ['crate', 'text'],
  crateMark: ['crate', 'text'],
  crateLetter: ['crate', 'text'],
  documentCode: ['fig'],
  subject: ['text', 'head'],
}

/**
 * Throws "invalid" where a view holds a letter the paper's fonts cannot show, naming each field by its path. A name left
 * out or put in other letters would make a document of somebody else. The last guard: what people type is refused where they
 * type it (lib/planning/reasons/paper.ts, printed() in lib/schemas).
 */
export function assertPrintable(view: object): void {
  const issues: FieldIssue[] = []
  eachText(view, '', (text, path, field) => {
    const faces = FACE_OF_FIELD[field] ?? ['text']
    const missing = [...new Set(faces.flatMap((face) => missingLetters(text, face)))]
    if (missing.length > 0) issues.push({ path, message: notOnPaperWords(text, missing), received: text })
  })
  if (issues.length === 0) return
  const [first] = issues
  throw new SteadfoldError('invalid', `The document cannot be printed. ${first?.message ?? ''}`, { issues })
}

function eachText(
  value: unknown,
  path: string,
  visit: (text: string, path: string, field: string) => void,
): void {
  if (typeof value === 'string') visit(value, path, fieldOf(path))
  else if (Array.isArray(value))
    value.forEach((item, index) => eachText(item, join(path, String(index)), visit))
  else if (typeof value === 'object' && value !== null) {
    for (const [key, item] of Object.entries(value)) eachText(item, join(path, key), visit)
  }
}

function fieldOf(path: string): string {
  const names = path.split('.').filter((part) => !/^\d+$/.test(part))
  return names.at(-1) ?? ''
}

function join(path: string, part: string): string {
  return path === '' ? part : `${path}.${part}`
}
