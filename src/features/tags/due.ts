import type { Tags } from '#shared/contracts/tags.ts'

export type KeeperTags = Extract<Tags, { part: 'keeper' }>
export type Pouch = KeeperTags['pouches'][number]

const sameUnit = (a: Pouch, b: Pouch): boolean => a.maker === b.maker && a.unit === b.unit

/** The pouch that still holds this one's unit under an earlier code, if any: it cannot be tagged before that is back. */
export const heldBy = (pouch: Pouch, pouches: readonly Pouch[]): Pouch | undefined =>
  pouches.find(
    (other) =>
      other.serving !== pouch.serving &&
      sameUnit(other, pouch) &&
      other.turn <= pouch.turn &&
      (other.state === 'out' || other.state === 'tagged'),
  )

/** What is to be tagged, in the order it is due: turn by turn, and within a turn first what is at hand. */
export function dueInOrder(pouches: readonly Pouch[]): Pouch[] {
  const held = (pouch: Pouch) => (heldBy(pouch, pouches) ? 1 : 0)
  return pouches
    .filter(({ state }) => state === 'to-tag')
    .map((pouch, nth) => ({ pouch, nth }))
    .sort((a, b) => a.pouch.turn - b.pouch.turn || held(a.pouch) - held(b.pouch) || a.nth - b.nth)
    .map(({ pouch }) => pouch)
}

/** How many of a turn's pouches are tagged or further. */
export function taggedIn(pouches: readonly Pouch[], turn: number): { tagged: number; of: number } {
  const here = pouches.filter((pouch) => pouch.turn === turn)
  return { tagged: here.filter(({ state }) => state !== 'to-tag').length, of: here.length }
}

/** The turns that have pouches, in order. */
export const turnsOf = (pouches: readonly { turn: number }[]): number[] =>
  [...new Set(pouches.map(({ turn }) => turn))].sort((a, b) => a - b)

export const pouchWords: Record<Pouch['state'], string> = {
  'to-tag': 'to tag',
  tagged: 'tagged',
  out: 'with the listener',
  free: 'back',
}

/** A round's short sign on a card: the first six characters of its id. It names the round, never a unit. */
export const shortRound = (round: string): string => round.slice(0, 6).toUpperCase()
