import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { CODE_ALPHABET, documentCode, printedCode, typedCode } from '@/lib/documents/code'

describe('document codes', () => {
  it('hold 32 different letters, none of them I, O, 0 or 1', () => {
    expect(new Set(CODE_ALPHABET).size).toBe(32)
    expect(CODE_ALPHABET).not.toMatch(/[IO01]/)
  })

  it('come back from print, whatever case, dash or space they are typed with', () => {
    fc.assert(
      fc.property(fc.uint8Array({ minLength: 8, maxLength: 8 }), (bytes) => {
        const code = documentCode(bytes)
        const typed = [
          printedCode(code),
          printedCode(code).toLowerCase(),
          ` ${code.slice(0, 4)} – ${code.slice(4)} `,
        ]
        return code.length === 8 && typed.every((text) => typedCode(text) === code)
      }),
    )
  })

  it('are refused when they cannot be one', () => {
    for (const typed of ['', 'R4XT-96K', 'R4XT-96KWW', 'R4XT-96K0', 'I4XT-96KW', 'R4XT_96KW'])
      expect(typedCode(typed)).toBeNull()
  })

  it('need eight bytes', () => {
    expect(() => documentCode(new Uint8Array(7))).toThrow(RangeError)
  })
})
