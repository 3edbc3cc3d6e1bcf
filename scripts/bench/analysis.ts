import { analyse } from '#shared/stats/analyse.ts'
import { seededRandom } from '#shared/stats/random.ts'

/** The analysis of a closed round, complete and with every seventh rating missing. */
for (const [units, listeners, descriptors] of [
  [4, 6, 11],
  [8, 20, 18],
] as const) {
  for (const gaps of [false, true]) {
    const random = seededRandom(`bench ${units} ${listeners}`)
    const places = (count: number) => Array.from({ length: count }, (_, place) => place)
    const rows = places(descriptors).flatMap((descriptor) =>
      places(listeners).flatMap((listener) =>
        places(units).map((unit) => ({
          panelist: `L${listener}`,
          unit: `U${unit}`,
          descriptor: `D${descriptor}`,
          replicate: 1,
          position: ((unit + listener) % units) + 1,
          score: gaps && (listener + unit + descriptor) % 7 === 0 ? null : 40 + 5 * unit + 30 * random(),
        })),
      ),
    )
    const from = performance.now()
    analyse(rows)
    const took = `${Math.round(performance.now() - from)} ms`
    const kind = gaps ? 'gaps' : 'complete'
    console.log(`  ${units} units, ${listeners} listeners, ${descriptors} descriptors, ${kind}: ${took}`)
  }
}
