/**
 * Elementary functions with the same bits in every JavaScript engine: pure arithmetic (FreeBSD msun ports of @stdlib),
 * never the engine's own Math.exp and kin, whose last bit differs between V8 versions. + − × ÷ and Math.sqrt are exact by IEEE 754.
 */
import cbrtOf from '@stdlib/math-base-special-cbrt'
import cosOf from '@stdlib/math-base-special-cos'
import expOf from '@stdlib/math-base-special-exp'
import lnOf from '@stdlib/math-base-special-ln'
import powOf from '@stdlib/math-base-special-pow'
import sinOf from '@stdlib/math-base-special-sin'

export const exp: (x: number) => number = expOf
export const ln: (x: number) => number = lnOf
export const pow: (x: number, y: number) => number = powOf
export const sin: (x: number) => number = sinOf
export const cos: (x: number) => number = cosOf
export const cbrt: (x: number) => number = cbrtOf
