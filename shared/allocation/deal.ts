import { range } from './balance.ts'
import { drawCodes, drawLetters } from './codes.ts'
import { createStream } from './stream.ts'
import { drawTurns } from './turns.ts'
import type { Balance, CodePolicy, CodeSet, DrawRow, Letter, Refusal, TurnPlan } from './types.ts'

/** All that the rows and codes of a round depend on: what the key publishes, and nothing about people. */
export type DealInput = {
  seed: string
  /** Sorted by UTF-16 code units, all different. */
  unitIds: readonly string[]
  listeners: number
  spares: number
  codePolicy: CodePolicy
  attempt: number
  excludedPairs: readonly { code: number; unit: string }[]
  excludedCodes: readonly number[]
}

export type Deal = {
  ok: true
  turns: number
  /** Sorted by listener number. */
  rows: DrawRow[]
  letters: Letter[]
  balance: Balance
}

/** Turns and listener numbers: they hang on the seed alone and stay while codes are drawn again. */
export function dealRows(
  input: Omit<DealInput, 'attempt' | 'codePolicy' | 'excludedPairs' | 'excludedCodes'>,
): {
  plan: TurnPlan
  numbers: number[]
} {
  const { seed, unitIds, listeners, spares } = input
  const plan = drawTurns({ units: unitIds.length, listeners, spares, stream: createStream(seed, 'turns') })
  const numbers = createStream(seed, 'listener numbers').shuffle(range(listeners + spares).map((i) => i + 1))
  return { plan, numbers }
}

type CodesOf = (row: number, unit: number) => Record<CodeSet, number>

function dealCodes(input: DealInput): { ok: true; codesOf: CodesOf; letters: Letter[] } | Refusal {
  const { unitIds: units, excludedPairs: pairs, excludedCodes: codes } = input
  const stream = createStream(input.seed, `codes ${input.attempt}`)
  if (input.codePolicy === 'split') {
    const drawn = drawLetters({ units, pairs, codes, stream })
    if (!drawn.ok) return drawn
    const byUnit = new Map(drawn.letters.map((letter) => [letter.unit, letter.codes]))
    const codesOf: CodesOf = (_, unit) => {
      const own = byUnit.get(units[unit]!)!
      return { served: own.served, takeover: own.served, reserve: own.reserve }
    }
    return { ok: true, codesOf, letters: drawn.letters }
  }
  const drawn = drawCodes({ rows: input.listeners + input.spares, units, pairs, codes, stream })
  if (!drawn.ok) return drawn
  return { ok: true, codesOf: (row, unit) => drawn.rows[row]![unit]!, letters: [] }
}

/** Rows, listener numbers, codes and letters from the seed: the part of a draw that anybody can repeat. */
export function deal(input: DealInput, rowsDealt = dealRows(input)): Deal | Refusal {
  const { plan, numbers } = rowsDealt
  const coded = dealCodes(input)
  if (!coded.ok) return coded
  const all = [...plan.rows, ...plan.spareRows]
  const rows = all.map(({ places }, row) => ({
    listener: numbers[row]!,
    takeoverListener: numbers[row]! + all.length,
    spare: row >= plan.rows.length,
    places: places.map(({ turn, position, unit }) => ({
      turn,
      position,
      unit: input.unitIds[unit]!,
      codes: coded.codesOf(row, unit),
    })),
  }))
  rows.sort((a, b) => a.listener - b.listener)
  return { ok: true, turns: plan.turns, rows, letters: coded.letters, balance: plan.balance }
}
