import type { Tags } from '#shared/contracts/tags.ts'

interface Pouch {
  servingId: string
  seatNumber: number
  turn: number
  code: string
  state: string
  maker: string
  unit: string
}

const states: Record<string, 'to-tag' | 'tagged' | 'out' | 'free'> = {
  waiting: 'to-tag',
  tagged: 'tagged',
  handed: 'out',
  confirmed: 'out',
}

export const presentKeeper = (
  sitting: { turn: number; turns: number },
  pouches: readonly Pouch[],
  reserves: readonly Omit<Pouch, 'servingId' | 'state'>[],
): Tags => ({
  part: 'keeper',
  turn: sitting.turn,
  turns: sitting.turns,
  pouches: pouches.map((one) => ({
    serving: one.servingId,
    seat: `Seat ${one.seatNumber}`,
    turn: one.turn,
    code: one.code,
    maker: one.maker,
    unit: one.unit,
    state: states[one.state] ?? 'free',
  })),
  reserves: reserves.map((one) => ({
    seat: `Seat ${one.seatNumber}`,
    turn: one.turn,
    code: one.code,
    maker: one.maker,
    unit: one.unit,
  })),
})

export const presentLetters = (
  rows: readonly { letter: string; maker: string; unit: string }[],
  done: ReadonlySet<string>,
): Tags => ({
  part: 'letters',
  pouches: rows.map(({ letter, maker, unit }) => ({ letter, maker, unit, done: done.has(letter) })),
})

export const presentCodes = (
  rows: readonly { letter: string; code: string; reserve: string }[],
  done: ReadonlySet<string>,
): Tags => ({
  part: 'codes',
  pouches: rows.map(({ letter, code, reserve }) => ({ letter, code, reserve, done: done.has(letter) })),
})
