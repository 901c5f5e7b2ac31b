import QRCode from 'qrcode'
import { describe, expect, it } from 'vitest'
import { qrModules, qrPicture } from '@/lib/documents/parts/qr'
import { renderManifest, renderSheet } from '@/lib/documents/render'
import { readDocumentCode } from '@/lib/documents/verify'
import { approvalStatement } from '@/lib/schemas/approval-statement'
import type { SheetView } from '@/lib/views/sheet'
import { manifest2433 } from './fixtures/manifest-2433'
import { sheet2441 } from './fixtures/sheet-2441'
import { fontsNotEmbedded, pdfInfo, textOf } from './support/pdf-tools'

const SLOW = 60_000

describe('the go/no-go sheet on paper', () => {
  it(
    'says on two A4 sheets what decides, for whom, where and by how much',
    async () => {
      const { bytes, pages } = await renderSheet(sheet2441)
      const text = await textOf(bytes)
      expect(pages).toBe(2)
      expect(await pdfInfo(bytes)).toMatchObject({ Pages: '2', 'Page size': '595.28 x 841.89 pts (A4)' })
      for (const words of [
        'NO-GO',
        'Otto (D), legs 7 and 8, alarm limit decides',
        'GO WITH CONDITIONS',
        'Nobody overrides a critical one',
        'Not yet.',
        'isn’t confirmed, so no figure on this sheet counts it',
        'Stop and ring the desk',
        '+44 141 496 0388',
        'For the vet. Not for the road: nothing is released.',
        'Sheet 1 of 2',
        'Sheet 2 of 2',
        'Body at most 39.4 °C, alarm high, snub-nosed dog',
        'A decision aid.',
      ]) {
        expect(text.replace(/\s+/g, ' '), words).toContain(words)
      }
    },
    SLOW,
  )

  it(
    'prints every leg, every condition, every crate and every breach',
    async () => {
      const text = (await textOf((await renderSheet(sheet2441)).bytes)).replace(/\s+/g, ' ')
      for (const { title } of sheet2441.legs) expect(text).toContain(title)
      for (const { text: words } of sheet2441.conditions) expect(text).toContain(words)
      for (const { crateMark } of sheet2441.stopLimits) expect(text).toContain(crateMark)
      for (const { asked, status } of sheet2441.findings)
        if (status === 'breach') expect(text).toContain(asked)
    },
    SLOW,
  )

  it(
    'grows by whole sheets and loses nothing when the plan is long',
    async () => {
      const long: SheetView = {
        ...sheet2441,
        legs: Array.from({ length: 27 }, (_, index) => ({
          ...sheet2441.legs[index % 9],
          ordinal: index + 1,
          legId: `leg-${index + 1}`,
          title: `Stretch ${index + 1} of the road`,
        })) as SheetView['legs'],
        findings: Array.from({ length: 60 }, (_, index) => ({
          ...sheet2441.findings[0],
          number: index + 1,
          asked: `Asked for the ${index + 1}th time`,
        })) as SheetView['findings'],
      }
      const { bytes, pages } = await renderSheet(long)
      const text = (await textOf(bytes)).replace(/\s+/g, ' ')
      expect((await pdfInfo(bytes)).Pages).toBe(String(pages))
      for (let index = 1; index <= 27; index += 1) expect(text).toContain(`Stretch ${index} of the road`)
      for (let index = 1; index <= 60; index += 1) expect(text).toContain(`Asked for the ${index}th time`)
      expect(text).toContain(`Sheet ${pages} of ${pages}`)
    },
    SLOW,
  )
})

describe('a vet’s signature on paper', () => {
  const [approval] = manifest2433.approvals
  if (approval === undefined) throw new Error('The fixture is signed.')
  const statement = approvalStatement({
    examined: false,
    crateMarks: ['2441-A', '2441-B', '2441-D'],
    overridden: [1, 2, 3, 4, 5].map(
      (leg) =>
        `Keeping warm takes under 60 % of what the animal can do, never an hour on end above it, Otto (D), leg ${leg} (road): 85 min past, body to 36.9 °C`,
    ),
  })
  const signed = { ...approval, crateMarks: ['2441-A', '2441-B', '2441-D'], statement }

  it(
    'names crates and findings in full on the sheet and on the manifest, however many',
    async () => {
      const sheet = await renderSheet({ ...sheet2441, approvals: [signed] })
      const manifest = await renderManifest({ ...manifest2433, approvals: [signed, signed] })
      for (const { bytes } of [sheet, manifest]) {
        const text = (await textOf(bytes)).replace(/\s+/g, ' ')
        // A statement stands in a column: its lines are told apart by what stands beside them.
        for (const leg of [1, 2, 3, 4, 5]) expect(text).toContain(`Otto (D), leg ${leg} (road): 85 min past`)
        for (const words of ['set-ups 2441-A, 2441-B and 2441-D', 'I override by name', signed.vetName])
          expect(text).toContain(words)
      }
    },
    SLOW,
  )
})

describe('stop limits on paper', () => {
  it(
    'are all printed, whatever their length and whatever stands beside them',
    async () => {
      const [first, ...others] = sheet2441.stopLimits
      if (first === undefined) throw new Error('The fixture has stop limits.')
      const cold = { ...first, strictest: { aboveC: -3, belowC: -28, aboveF: 26, belowF: -18 } }
      const own = {
        ...cold,
        byLeg: [1, 2, 3, 4, 5].map((ordinal) => ({
          ...cold.strictest,
          legId: `leg-${ordinal}`,
          ordinal,
          aboveC: 20 + ordinal,
          plannedInside: ordinal === 1,
          overridden: false,
        })),
      }
      const text = (
        await textOf((await renderSheet({ ...sheet2441, stopLimits: [own, ...others] })).bytes)
      ).replace(/\s+/g, ' ')
      for (const words of ['−3 °C', '−28 °C', '26 °F', '−18 °F', 'leg 5, −28 to 25 °C'])
        expect(text).toContain(words)
      for (const { strictest } of others)
        for (const c of [strictest.aboveC, strictest.belowC]) expect(text).toContain(`${c ?? ''} °C`)
    },
    SLOW,
  )
})

describe('the manifest on paper', () => {
  it(
    'says parties, animals, limits, vet, whom to ring and how to check it',
    async () => {
      const { bytes, pages } = await renderManifest(manifest2433)
      const text = (await textOf(bytes)).replace(/\s+/g, ' ')
      expect(pages).toBe(2)
      for (const words of [
        'Balfron Lodge Kennels',
        'Bajja House Boarding',
        'Chip 999 000 0131 77402',
        '2433-C',
        '26 °C',
        '78 °F',
        'This is not a certificate of fitness to travel.',
        'Registration VR 40 817, GB',
        'Valid to 31 Mar 2027',
        '+44 7700 900 418',
        'R4XT-96KW',
        'd14f40e1 84ec6eab',
        'The digital signature stands here.',
        'Original. Travels with the crates.',
      ]) {
        expect(text, words).toContain(words)
      }
      expect(text).not.toMatch(/void when/i)
      // A plan has no waybill, so the paper does not speak of one.
      expect(text).not.toMatch(/waybill/i)
    },
    SLOW,
  )

  it(
    'carries its code where a reader of files finds it, and embeds every face it uses',
    async () => {
      const { bytes } = await renderManifest(manifest2433)
      expect(readDocumentCode(bytes)).toBe('R4XT96KW')
      const outside = await fontsNotEmbedded(bytes)
      // The renderer names Helvetica as its default and draws nothing with it.
      expect(outside.filter((name) => !name.startsWith('Helvetica'))).toEqual([])
    },
    SLOW,
  )
})

describe('a text the paper cannot show', () => {
  it('is refused by its field and with its letters, and nothing is drawn', async () => {
    const [first, ...others] = manifest2433.animals
    const view = { ...manifest2433, animals: [{ ...first, name: 'Γαία' }, ...others] } as typeof manifest2433
    await expect(Promise.resolve().then(() => renderManifest(view))).rejects.toMatchObject({
      code: 'invalid',
      issues: [
        { path: 'animals.0.name', message: expect.stringContaining('“Γ”') as string, received: 'Γαία' },
      ],
    })
  })

  it('names every such field at once', async () => {
    const view = { ...manifest2433, headline: '한', consignor: { name: '犬', lines: ['ok', 'не'] } }
    await expect(Promise.resolve().then(() => renderManifest(view))).rejects.toMatchObject({
      issues: [{ path: 'consignor.name' }, { path: 'consignor.lines.1' }, { path: 'headline' }],
    })
  })

  it(
    'is none of the letters of European passports',
    async () => {
      const names = 'Łódź Žluťoučký Ærøskøbing Şırnak Győr Íñigo Ħamrun Ŷ ß Đorđe Þór Œuvre'
      const view = { ...manifest2433, consignor: { ...manifest2433.consignor, name: names } }
      // After another paper of the same process, too: a font that remembers drops letters from the next document.
      await renderManifest(manifest2433)
      const text = await textOf((await renderManifest(view)).bytes)
      const found = names.split(' ').filter((name) => text.normalize('NFC').includes(name.normalize('NFC')))
      expect(found.join(' ')).toBe(names)
    },
    SLOW,
  )
})

describe('the square', () => {
  it('holds the modules the QR library makes of the address at correction M', () => {
    const { modules } = QRCode.create(manifest2433.verifyUrl, { errorCorrectionLevel: 'M' })
    const ours = qrModules(manifest2433.verifyUrl)
    expect(ours.flat().map(Number)).toEqual([...modules.data].map((module) => (module ? 1 : 0)))
  })

  it('is drawn with its quiet ground, module for module', () => {
    const modules = qrModules(manifest2433.verifyUrl)
    const unit = 4
    const size = (modules.length + 4) * unit
    const { marks } = qrPicture(manifest2433.verifyUrl, size)
    const drawn = marks.flatMap((mark) =>
      mark.kind === 'path' ? [...mark.d.matchAll(/M([\d.]+) ([\d.]+)h([\d.]+)/g)] : [],
    )
    const inked = new Set<string>()
    for (const [, x, y, width] of drawn) {
      for (let column = 0; column < Number(width) / unit; column += 1)
        inked.add(`${Number(x) / unit - 2 + column} ${Number(y) / unit - 2}`)
    }
    const wanted = modules.flatMap((row, y) => row.flatMap((ink, x) => (ink ? [`${x} ${y}`] : [])))
    expect([...inked].sort()).toEqual(wanted.sort())
  })
})
