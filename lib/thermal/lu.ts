/** LU with row pivoting in place of `a` (row-major n × n). Returns false when the matrix is singular or not finite. */
export function factor(a: Float64Array, n: number, pivots: Int32Array): boolean {
  for (let k = 0; k < n; k++) {
    let best = k
    let largest = Math.abs(a[k * n + k] as number)
    for (let i = k + 1; i < n; i++) {
      const size = Math.abs(a[i * n + k] as number)
      if (size > largest) {
        largest = size
        best = i
      }
    }
    if (!(largest > 0) || largest === Infinity) return false
    pivots[k] = best
    if (best !== k) swapRows(a, n, k, best)
    const inverse = 1 / (a[k * n + k] as number)
    for (let i = k + 1; i < n; i++) {
      const row = i * n
      const multiplier = (a[row + k] as number) * inverse
      if (multiplier === 0) continue
      a[row + k] = multiplier
      for (let j = k + 1; j < n; j++)
        a[row + j] = (a[row + j] as number) - multiplier * (a[k * n + j] as number)
    }
  }
  return true
}

/** Solves in place for the vector at `b[at…at+n)`, element stride 1. */
export function solve(a: Float64Array, n: number, pivots: Int32Array, b: Float64Array, at: number): void {
  for (let k = 0; k < n; k++) {
    const p = pivots[k] as number
    if (p === k) continue
    const held = b[at + k] as number
    b[at + k] = b[at + p] as number
    b[at + p] = held
  }
  for (let i = 1; i < n; i++) {
    let sum = b[at + i] as number
    for (let j = 0; j < i; j++) sum -= (a[i * n + j] as number) * (b[at + j] as number)
    b[at + i] = sum
  }
  for (let i = n - 1; i >= 0; i--) {
    let sum = b[at + i] as number
    for (let j = i + 1; j < n; j++) sum -= (a[i * n + j] as number) * (b[at + j] as number)
    b[at + i] = sum / (a[i * n + i] as number)
  }
}

function swapRows(a: Float64Array, n: number, k: number, p: number): void {
  for (let j = 0; j < n; j++) {
    const held = a[k * n + j] as number
    a[k * n + j] = a[p * n + j] as number
    a[p * n + j] = held
  }
}
