import type { BlockJacobian, Jacobian } from './jacobian'
import type { Block, Layout } from './layout'
import { factor, solve } from './lu'

/** LU of I/(hγ) − J for an arrow-shaped J: each block once, then the border with what the blocks pass on to it. */
export interface ArrowFactors {
  blocks: {
    matrix: Float64Array
    pivots: Int32Array
    /** Columns of block⁻¹ × fromBorder, one after another. */ carried: Float64Array
  }[]
  corner: Float64Array
  cornerPivots: Int32Array
}

export function arrowFactors(layout: Layout): ArrowFactors {
  return {
    blocks: layout.blocks.map(({ size }) => ({
      matrix: new Float64Array(size * size),
      pivots: new Int32Array(size),
      carried: new Float64Array(size * layout.border),
    })),
    corner: new Float64Array(layout.border * layout.border),
    cornerPivots: new Int32Array(layout.border),
  }
}

/** `diagonal` is 1/(hγ). Returns false when the matrix is singular. */
export function setFactors(
  factors: ArrowFactors,
  layout: Layout,
  jacobian: Jacobian,
  diagonal: number,
): boolean {
  const { border } = layout
  for (let i = 0; i < border * border; i++) factors.corner[i] = -(jacobian.corner[i] as number)
  for (let i = 0; i < border; i++)
    factors.corner[i * border + i] = diagonal + (factors.corner[i * border + i] as number)
  for (let b = 0; b < layout.blocks.length; b++) {
    const { size } = layout.blocks[b] as Block
    const j = jacobian.blocks[b] as BlockJacobian
    const into = factors.blocks[b] as ArrowFactors['blocks'][number]
    const { matrix, carried } = into
    for (let i = 0; i < size * size; i++) matrix[i] = -(j.own[i] as number)
    for (let i = 0; i < size; i++) matrix[i * size + i] = diagonal + (matrix[i * size + i] as number)
    if (!factor(matrix, size, into.pivots)) return false
    for (let c = 0; c < border; c++) {
      for (let i = 0; i < size; i++) carried[c * size + i] = j.fromBorder[i * border + c] as number
      solve(matrix, size, into.pivots, carried, c * size)
    }
    for (let r = 0; r < border; r++) {
      for (let c = 0; c < border; c++) {
        let sum = 0
        for (let i = 0; i < size; i++)
          sum += (j.toBorder[r * size + i] as number) * (carried[c * size + i] as number)
        factors.corner[r * border + c] = (factors.corner[r * border + c] as number) - sum
      }
    }
  }
  return border === 0 || factor(factors.corner, border, factors.cornerPivots)
}

/** Solves in place for `x`, the whole state's vector. */
export function solveArrow(factors: ArrowFactors, layout: Layout, jacobian: Jacobian, x: Float64Array): void {
  const { border, borderAt } = layout
  for (let b = 0; b < layout.blocks.length; b++) {
    const { at, size } = layout.blocks[b] as Block
    const { matrix, pivots } = factors.blocks[b] as ArrowFactors['blocks'][number]
    solve(matrix, size, pivots, x, at)
    const j = jacobian.blocks[b] as BlockJacobian
    for (let r = 0; r < border; r++) {
      let sum = x[borderAt + r] as number
      for (let i = 0; i < size; i++) sum += (j.toBorder[r * size + i] as number) * (x[at + i] as number)
      x[borderAt + r] = sum
    }
  }
  if (border === 0) return
  solve(factors.corner, border, factors.cornerPivots, x, borderAt)
  for (let b = 0; b < layout.blocks.length; b++) {
    const { at, size } = layout.blocks[b] as Block
    const { carried } = factors.blocks[b] as ArrowFactors['blocks'][number]
    for (let c = 0; c < border; c++) {
      const z = x[borderAt + c] as number
      for (let i = 0; i < size; i++) x[at + i] = (x[at + i] as number) + (carried[c * size + i] as number) * z
    }
  }
}
