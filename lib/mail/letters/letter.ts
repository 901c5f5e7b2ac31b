import { letterHtml } from './html'
import type { LetterHead, LetterPart } from './parts'
import { letterText } from './text'

/*
 * A letter is a list of parts. Its HTML and its plain text are both made from that one list, so that they say the same in
 * the same order, and neither has a sentence the other lacks.
 */

export interface WrittenLetter {
  subject: string
  text: string
  html: string
}

/** The letter as a mail's subject and its two parts. */
export function written(subject: string, head: LetterHead, parts: LetterPart[]): WrittenLetter {
  // A line break in a subject would end the header.
  const oneLine = subject.replace(/\s+/g, ' ').trim()
  return { subject: oneLine, text: letterText(head, parts), html: letterHtml(oneLine, head, parts) }
}
