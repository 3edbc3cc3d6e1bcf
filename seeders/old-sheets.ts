import { storeImport } from '#server/features/imports/service.ts'
import { acting } from './acting.ts'
import { publishVerdict } from './publishing.ts'
import { createStream } from '#shared/allocation/stream.ts'
import { createHash } from 'node:crypto'
import { eveningBefore, type World } from './world.ts'

/** Means of four units on three lines, as an invented club kept them on paper: 1 to 9, each unit twice. */
const means: Readonly<Record<string, Readonly<Record<string, number>>>> = {
  Bollard: { 'Overall liking': 5.2, Warmth: 6.8, 'Fits under a cap': 3.1 },
  Windlass: { 'Overall liking': 6.9, Warmth: 5.6, 'Fits under a cap': 7.4 },
  Thole: { 'Overall liking': 4.1, Warmth: 3.2, 'Fits under a cap': 8.0 },
  Painter: { 'Overall liking': 6.2, Warmth: 7.3, 'Fits under a cap': 4.4 },
}
const club = ['Reader A', 'Reader B', 'Reader C', 'Reader D', 'Reader E', 'Reader F', 'Reader G', 'Reader H']

/** The sheets as a ratings file in long form; two cells were left empty. */
export function sheets(): string {
  const stream = createStream(createHash('sha256').update('old sheets').digest('hex'), 'sheets')
  const lines = ['panelist,unit,descriptor,replicate,position,score']
  for (const listener of club) {
    const lean = (stream.integer(2001) - 1000) / 1600
    for (const replicate of [1, 2])
      stream.shuffle(Object.keys(means)).forEach((unit, place) => {
        for (const [descriptor, mean] of Object.entries(means[unit] ?? {})) {
          const wander = (stream.integer(2001) + stream.integer(2001) - 2000) / 1000
          const score = Math.min(9, Math.max(1, Math.round(2 * (mean + lean + wander)) / 2))
          const empty = stream.integer(96) === 0
          lines.push([listener, unit, descriptor, replicate, place + 1, empty ? '' : score].join(','))
        }
      })
  }
  return `${lines.join('\n')}\n`
}

/** Ratings that were taken before there was Scrim: brought in, labelled, published. */
export async function bringOldSheets(world: World): Promise<void> {
  const round = await storeImport(
    acting(world.deps, world.organiser, eveningBefore(world, 121)),
    world.slug,
    {
      title: 'Four from the old sheets',
      question: 'What did eight readers say of four with a cap on?',
      text: sheets(),
      leaveOutFaults: false,
      primaryDescriptor: 'Warmth',
    },
  )
  await publishVerdict(
    world,
    round,
    {
      headline: 'Painter and Bollard are heard as warm, Thole as cool',
      summary:
        'Eight readers rated four earphones twice each on paper, from 1 to 9. The sheets were typed in later. Nobody wrote down how the units were hidden, so this page cannot say how blind the evening was.',
    },
    eveningBefore(world, 119),
  )
}
