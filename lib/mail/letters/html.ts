import { COLOURS, FACES, type FaceName } from '@/lib/tokens'
import type { Stamp } from '@/lib/views/sheet'
import type { LetterCell, LetterColumn, LetterHead, LetterPart } from './parts'
import { stampWords } from './text'

/*
 * HTML for mail readers of every age: one column of at most 600 px, tables with styles in each cell, no image and no style
 * sheet. The slat mark is built of cells; frames are borders.
 */

const INK = COLOURS.day

/** The whole mail. Every text is escaped here and nowhere else. */
export function letterHtml(subject: string, head: LetterHead, parts: LetterPart[]): string {
  return `<!doctype html>
<html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1"><meta name="color-scheme" content="light only"><title>${escaped(subject)}</title></head>
<body style="margin:0;padding:0;background:${INK.ground}">
<table role="presentation" cellpadding="0" cellspacing="0" border="0" width="100%" bgcolor="${INK.ground}" style="background:${INK.ground}"><tr><td align="center" style="padding:20px 8px">
<div style="display:none;max-height:0;overflow:hidden;font-size:1px;line-height:1px;color:${INK.ground}">${escaped(head.preview)}</div>
<table role="presentation" cellpadding="0" cellspacing="0" border="0" width="600" bgcolor="${INK.sheet}" style="width:100%;max-width:600px;background:${INK.sheet};border:2px solid ${INK.ink}">
${maker(head.firm)}
${title(head)}
${parts.map((part) => row(part)).join('\n')}
<tr><td height="18" style="height:18px;line-height:18px;font-size:1px">&nbsp;</td></tr>
</table></td></tr></table></body></html>`
}

function face(name: FaceName): string {
  const { family, fallback } = FACES[name]
  return `font-family:'${family}',${fallback.replaceAll('"', "'")}`
}

function type(name: FaceName, size: number, line: number, more = ''): string {
  return `${face(name)};font-size:${size}px;line-height:${line}px;color:${INK.ink};${more}`
}

const SPACE = '&nbsp;'

function maker(firm: string): string {
  const bar = `<td colspan="7" height="6" bgcolor="${INK.ink}" style="height:6px;line-height:6px;font-size:1px">${SPACE}</td>`
  const gap = `<tr><td colspan="7" height="3" style="height:3px;line-height:3px;font-size:1px">${SPACE}</td></tr>`
  const holes = [4, 3, 5, 3, 4, 3, 4]
    .map(
      (width, index) =>
        `<td width="${width}" height="6" bgcolor="${index % 2 === 0 ? INK.ink : INK.sheet}" style="width:${width}px;height:6px;line-height:6px;font-size:1px">${SPACE}</td>`,
    )
    .join('')
  const mark = `<table role="presentation" cellpadding="0" cellspacing="0" border="0" width="26" style="width:26px"><tr>${bar}</tr>${gap}<tr>${holes}</tr>${gap}<tr>${bar}</tr></table>`
  return `<tr><td style="padding:14px 24px 12px"><table role="presentation" cellpadding="0" cellspacing="0" border="0" width="100%"><tr><td width="36" valign="middle" style="width:36px">${mark}</td><td valign="middle" style="${type('crate', 19, 24)}">STEADFOLD</td><td align="right" valign="middle" style="${type('text', 14, 20, `color:${INK.mute};text-align:right`)}">${escaped(firm)}</td></tr></table></td></tr>
<tr><td height="9" bgcolor="${INK.ink}" style="height:9px;line-height:9px;font-size:1px">${SPACE}</td></tr>`
}

function title({ mark, title: words, under }: LetterHead): string {
  return `<tr><td style="padding:18px 24px 0"><table role="presentation" cellpadding="0" cellspacing="0" border="0" width="100%"><tr><td valign="bottom" style="${type('crate', 46, 46)}">${escaped(mark)}</td><td align="right" valign="bottom" style="${type('text', 16, 22, 'text-align:right')}"><b style="${type('head', 20, 24)}">${escaped(words)}</b><br>${escaped(under)}</td></tr></table></td></tr>`
}

function row(part: LetterPart): string {
  switch (part.kind) {
    case 'stamp':
      return cell('14px 24px 0', stamp(part.stamp))
    case 'paragraph':
      return cell('10px 24px 0', paragraph(part))
    case 'links':
      return cell('16px 24px 4px', links(part.links))
    case 'heading':
      return cell(
        '18px 24px 0',
        `<table role="presentation" cellpadding="0" cellspacing="0" border="0" width="100%"><tr><td style="border-top:2px solid ${INK.ink};padding:8px 0 6px;${type('head', 20, 24, 'font-weight:700')}">${escaped(part.text)}</td></tr></table>`,
      )
    case 'facts':
      return cell('0 24px', table(part.rows.map(({ label, lines }) => fact(label, lines)).join('')))
    case 'numbered':
      return cell('0 24px', table(part.rows.map(numbered).join('')))
    case 'table':
      return cell('0 24px', dataTable(part.heads, part.rows))
    case 'note':
      return cell(
        '10px 24px 0',
        `<p style="margin:0;padding:0;${type('text', 14, 21, `color:${INK.mute}`)}">${escaped(part.text)}</p>`,
      )
  }
}

function cell(padding: string, content: string): string {
  return `<tr><td style="padding:${padding}">${content}</td></tr>`
}

function table(rows: string): string {
  return `<table role="presentation" cellpadding="0" cellspacing="0" border="0" width="100%">${rows}</table>`
}

function stamp(given: Stamp): string {
  const words = stampWords(given)
  const lettering = type('head', 26, 30, 'font-weight:800;letter-spacing:1px')
  if (given.outOfDate || given.verdict === 'none') {
    return bordered(
      `1px dotted ${INK.mute}`,
      `<td style="padding:11px 20px;${lettering};color:${INK.mute}">${escaped(words)}</td>`,
    )
  }
  if (given.verdict === 'no-go') {
    return `<table role="presentation" cellpadding="0" cellspacing="0" border="0"><tr><td bgcolor="${INK.ink}" style="background:${INK.ink};padding:15px 24px;${lettering};color:${INK['on-ink']}">NO-GO</td></tr></table>`
  }
  if (given.verdict === 'go')
    return bordered(`4px solid ${INK.ink}`, `<td style="padding:11px 20px;${lettering}">GO</td>`)
  const count =
    given.conditions === 0
      ? ''
      : `<td style="border-left:4px dashed ${INK.ink};padding:11px 18px;${type('fig', 28, 30, 'font-weight:600')}">${given.conditions}</td>`
  return bordered(
    `4px dashed ${INK.ink}`,
    `<td style="padding:11px 20px;${lettering}">GO WITH CONDITIONS</td>${count}`,
  )
}

function bordered(border: string, cells: string): string {
  return `<table role="presentation" cellpadding="0" cellspacing="0" border="0" style="border:${border}"><tr>${cells}</tr></table>`
}

function paragraph({ bold, text, after }: Extract<LetterPart, { kind: 'paragraph' }>): string {
  const start = bold === undefined ? '' : `<b>${escaped(bold)}</b> `
  const end = after === undefined ? '' : ` <b>${escaped(after)}</b>`
  return `<p style="margin:0;padding:0;${type('text', 16, 24)}">${start}${escaped(text)}${end}</p>`
}

function links(all: { label: string; url: string; first: boolean }[]): string {
  const cells = all.map(({ label, url, first }) => {
    const ground = first
      ? `bgcolor="${INK['hand-fill']}" style="background:${INK['hand-fill']};border:1px solid ${INK['hand-fill']}"`
      : `style="border:1px solid ${INK.hand}"`
    return `<td ${ground}><a href="${escaped(url)}" style="display:block;padding:12px 20px;${type('text', 16, 22, 'font-weight:600;text-decoration:none')};color:${first ? INK['on-hand'] : INK.hand}">${escaped(label)}</a></td>`
  })
  return `<table role="presentation" cellpadding="0" cellspacing="0" border="0"><tr>${cells.join(`<td width="12" style="width:12px">${SPACE}</td>`)}</tr></table>`
}

function fact(label: string, lines: string[]): string {
  const edge = `border-top:1px solid ${INK.hair}`
  return `<tr><td width="112" valign="top" style="width:112px;padding:6px 8px 6px 0;${edge};${type('text', 14, 22, `color:${INK.mute}`)}">${escaped(label)}</td><td valign="top" style="padding:6px 0;${edge};${type('text', 16, 22)}">${lines.map(escaped).join('<br>')}</td></tr>`
}

function numbered({ number, text, under }: { number: number; text: string; under: string }): string {
  const edge = `border-top:1px solid ${INK.hair}`
  const small =
    under === ''
      ? ''
      : `<br><span style="font-size:14px;line-height:20px;color:${INK.mute}">${escaped(under)}</span>`
  return `<tr><td width="30" valign="top" style="width:30px;padding:8px 0;${edge};${type('head', 16, 22, 'font-weight:700')}">${number}</td><td valign="top" style="padding:8px 0;${edge};${type('text', 16, 22)}">${escaped(text)}${small}</td></tr>`
}

function dataTable(heads: LetterColumn[], rows: LetterCell[][]): string {
  const head = heads.map(
    ({ head: words, right }) =>
      `<th align="${right ? 'right' : 'left'}" valign="bottom" scope="col" style="padding:4px 8px 4px 0;border-bottom:1px solid ${INK.ink};${type('text', 13, 17, `font-weight:600;color:${INK.mute};text-align:${right ? 'right' : 'left'}`)}">${escaped(words)}</th>`,
  )
  const body = rows.map(
    (cells) => `<tr>${cells.map((one, index) => dataCell(one, heads[index]?.right ?? false)).join('')}</tr>`,
  )
  return `<table cellpadding="0" cellspacing="0" border="0" width="100%"><tr>${head.join('')}</tr>${body.join('')}</table>`
}

function dataCell({ text, under, mark, bold, verdict }: LetterCell, right: boolean): string {
  const words = mark
    ? `<span style="${type('crate', 18, 21)};white-space:nowrap">${escaped(text)}</span>`
    : verdict
      ? framed(text, verdict)
      : bold
        ? `<b>${escaped(text)}</b>`
        : escaped(text)
  const small =
    under === undefined || under === ''
      ? ''
      : `<br><span style="font-size:14px;color:${INK.mute}">${escaped(under)}</span>`
  return `<td align="${right ? 'right' : 'left'}" valign="top" style="padding:7px 8px 7px 0;border-top:1px solid ${INK.hair};${type('text', 15, 21, `text-align:${right ? 'right' : 'left'}`)}">${words}${small}</td>`
}

function framed(text: string, verdict: NonNullable<LetterCell['verdict']>): string {
  const figures = type('fig', 14, 18)
  if (verdict === 'no-go')
    return `<span style="display:inline-block;padding:1px 6px;background:${INK.ink};${figures};color:${INK['on-ink']};white-space:nowrap">${escaped(text)}</span>`
  return `<span style="display:inline-block;padding:1px 6px;border:2px ${verdict === 'go' ? 'solid' : 'dashed'} ${INK.ink};${figures};white-space:nowrap">${escaped(text)}</span>`
}

export function escaped(text: string): string {
  return text
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/"/g, '&quot;')
    .replace(/\n/g, '<br>')
}
