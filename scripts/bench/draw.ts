import { drawRound } from '#shared/allocation/draw.ts'

/** The draw of a round: a common evening, a long one, and about as many codes as a sitting can hold. */
for (const [units, listeners] of [
  [4, 6],
  [6, 12],
  [8, 10],
] as const) {
  const from = performance.now()
  const result = drawRound({
    seed: '6b'.repeat(32),
    scheme: 'scrim-draw-1',
    mode: 'turns',
    units: Array.from({ length: units }, (_, place) => ({ id: `unit-${place}` })),
    seats: Array.from({ length: listeners }, (_, place) => ({ seatRef: `seat-${place}` })),
    spares: 2,
    codePolicy: 'per-seat',
    history: { pairs: [], codes: [], seats: [] },
  })
  const took = `${Math.round(performance.now() - from)} ms`
  console.log(`  ${units} units, ${listeners} listeners: ${result.ok ? took : result.detail}`)
}
