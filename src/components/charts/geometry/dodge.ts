/**
 * Stacks points that would lie on one another: each takes the lowest level on which no earlier point is nearer than
 * `gap`. Levels are returned in the order of the input; beyond `most` levels points share the top one.
 */
export function dodge(xs: number[], gap: number, most = 4): number[] {
  const lastOnLevel: number[] = []
  const levels = new Array<number>(xs.length).fill(0)
  const order = xs.map((_, nth) => nth).sort((a, b) => (xs[a] ?? 0) - (xs[b] ?? 0))
  for (const nth of order) {
    const x = xs[nth] ?? 0
    let level = lastOnLevel.findIndex((last) => x - last >= gap)
    if (level < 0) level = Math.min(lastOnLevel.length, most - 1)
    lastOnLevel[level] = x
    levels[nth] = level
  }
  return levels
}
