const at = (list: readonly number[], index: number): number => list[index] as number

function firstRow(n: number): number[] {
  return Array.from({ length: n }, (_, j) => (j % 2 === 1 ? (j + 1) / 2 : (n - j / 2) % n))
}

/** One half of the pair: n rows in which no unit stands twice at one position. */
export function half(n: number, direction: 'forward' | 'reversed'): number[][] {
  if (!Number.isInteger(n) || n < 2) throw new RangeError('a square needs at least two units')
  const first = firstRow(n)
  const rows = Array.from({ length: n }, (_, shift) => first.map((_, j) => (at(first, j) + shift) % n))
  return direction === 'forward' ? rows : rows.map((row) => [...row].reverse())
}

/**
 * The Williams square of order n (Williams 1949, Aust. J. Sci. Res. A2:149): n rows for even n, 2n for odd n (each
 * row forward, then each reversed). Every ordered pair of units is adjacent once (even n) or twice (odd n).
 */
export function square(n: number): number[][] {
  return n % 2 === 0 ? half(n, 'forward') : [...half(n, 'forward'), ...half(n, 'reversed')]
}
