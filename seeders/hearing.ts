import { createStream, type Stream } from '#shared/allocation/stream.ts'
import { liking } from '#shared/domain/lexicon.ts'
import { createHash } from 'node:crypto'
import { ears } from './people.ts'
import { disputed, sounds } from './sounds.ts'

export interface InventedAnswer {
  descriptor: string
  value: number | null
  cantTell: boolean
}

const word = 2 ** 32
const uniform = (stream: Stream): number => stream.integer(word) / word
/** A standard normal draw: the sum of twelve uniform ones, less six. */
const normal = (stream: Stream): number =>
  Array.from({ length: 12 }, () => uniform(stream)).reduce((a, b) => a + b) - 6

/** A listener’s own shift on one descriptor: some use the upper half of every line, others the lower. */
const lean = (name: string, descriptor: string): number => normal(streamOf(`lean ${name} ${descriptor}`)) * 2

const streamOf = (label: string): Stream =>
  createStream(createHash('sha256').update(label).digest('hex'), 'hearing')

function valueOf(name: string, unit: string, descriptor: string, stream: Stream): number {
  const ear = ears[name]
  const sound = sounds[unit]
  if (!ear || !sound) throw new RangeError(`nobody knows how ${name} hears ${unit}`)
  if (disputed.has(descriptor)) return 52 + normal(stream) * 19
  const middle = descriptor === liking.key ? sound.liked[ear.camp] : (sound.heard[descriptor] ?? 50)
  const heard = ear.lost ? 50 + (middle - 50) * 0.6 : middle
  return heard + lean(name, descriptor) + normal(stream) * ear.wander
}

/**
 * One invented listener’s answers for one serving: the same for the same round, listener and unit, whatever code hid it.
 *
 * @param round a name for the round, so that two rounds differ
 * @param scorecard keys in their order, liking first
 */
export function answersOf(
  round: string,
  name: string,
  unit: string,
  scorecard: readonly string[],
): InventedAnswer[] {
  return scorecard.map((descriptor) => {
    const stream = streamOf(`${round} ${name} ${unit} ${descriptor}`)
    const cantTell = uniform(stream) < (disputed.has(descriptor) ? 0.07 : 0.004) && descriptor !== liking.key
    const value = Math.round(Math.min(100, Math.max(0, valueOf(name, unit, descriptor, stream))))
    return { descriptor, value: cantTell ? null : value, cantTell }
  })
}

const remarks = [
  'The bells have more room round them here.',
  'A little sharp on the trumpet, else easy to listen to.',
  'I kept forgetting that I was rating.',
  'The singer stands very close.',
  'Full and slow. Nice for the cello.',
  'Hard to say anything about distance on these tracks.',
  'Hiss on the brushes that I did not notice before.',
]

/** What somebody adds in their own words, now and then. */
export function remarkOf(round: string, name: string, unit: string): string {
  const stream = streamOf(`remark ${round} ${name} ${unit}`)
  return uniform(stream) < 0.18 ? stream.pick(remarks) : ''
}
