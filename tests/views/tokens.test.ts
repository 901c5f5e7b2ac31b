import { describe, expect, it } from 'vitest'
import { COLOURS, RAMP, STROKE, rampStep } from '@/lib/tokens'
import type { ColourName, Light } from '@/lib/tokens'

/*
 * Contrast after the W3C's Web Content Accessibility Guidelines 2.2, definitions "relative luminance" and "contrast ratio";
 * 4.5 for text (criterion 1.4.3), 3 for graphics and edges of controls (1.4.11).
 */
const LIGHTS: Light[] = ['day', 'night', 'paper']
const GROUNDS: ColourName[] = ['ground', 'sheet', 'band', 'handwash']

describe('contrast', () => {
  for (const light of LIGHTS) {
    const ink = COLOURS[light]
    it(`${light}: words read on every ground`, () => {
      for (const text of ['ink', 'mute', 'hand'] as const) {
        for (const ground of GROUNDS) {
          expect(contrast(ink[text], ink[ground]), `${text} on ${ground}`).toBeGreaterThanOrEqual(4.5)
        }
      }
      expect(contrast(ink['on-ink'], ink.ink), 'NO-GO words').toBeGreaterThanOrEqual(4.5)
      expect(contrast(ink['on-hand'], ink['hand-fill']), 'first button').toBeGreaterThanOrEqual(4.5)
      expect(contrast(ink['no-dim'], ink.wall), 'figures in the departure wall').toBeGreaterThanOrEqual(4.5)
    })

    it(`${light}: edges and hatching stand off every ground`, () => {
      for (const ground of GROUNDS) {
        expect(contrast(ink.rule, ink[ground]), `rule on ${ground}`).toBeGreaterThanOrEqual(3)
      }
    })
  }

  it('prints a number on every step of the ramp', () => {
    for (const step of RAMP) {
      for (const { fill, text } of [step.day, step.night]) {
        expect(contrast(fill, text), step.name).toBeGreaterThanOrEqual(4.5)
      }
    }
  })

  // White on black is 21 by definition; #777777 on white is the W3C's well-known 4.48.
  it('is measured rightly', () => {
    expect(contrast('#FFFFFF', '#000000')).toBeCloseTo(21, 5)
    expect(contrast('#777777', '#FFFFFF')).toBeCloseTo(4.48, 2)
  })
})

describe('ramp', () => {
  it('changes exactly at its breaks', () => {
    expect([-0.1, 0, 4.9, 5, 10, 15, 21.9, 22, 27, 32, 37.9, 38].map(rampStep)).toEqual([
      'k4',
      'k3',
      'k3',
      'k2',
      'k1',
      'n0',
      'n0',
      'h1',
      'h2',
      'h3',
      'h3',
      'h4',
    ])
  })
})

describe('lines', () => {
  it('draw a critical limit twice as thick as an alarm limit', () => {
    expect(STROKE.critical).toBe(STROKE.alarm * 2)
  })
})

function contrast(a: string, b: string): number {
  const [light, dark] = [luminance(a), luminance(b)].sort((x, y) => y - x)
  return ((light ?? 0) + 0.05) / ((dark ?? 0) + 0.05)
}

function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}
