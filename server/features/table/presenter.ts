import type { StewardTable } from '#shared/contracts/table.ts'

export interface SeatRow {
  id: string
  label: string
  number: number
  joined: boolean
  left: boolean
  endAnswered: boolean
  servingId: string | null
  code: string | null
  state: 'waiting' | 'tagged' | 'handed' | 'confirmed' | 'submitted' | 'void' | 'missed' | null
  servingVersion: number | null
  wrongCodes: number | null
  seal: 'yes' | 'unsure' | 'no' | null
  restUntil: Date | null
}

export interface TableParts {
  round: { id: string; title: string; status: string; blinding: string }
  sitting: { id: string; name: string; turn: number; turns: number; version: number; endedAt: Date | null }
  seats: readonly SeatRow[]
  spareRows: number
  now: Date
  youListen: boolean
}

/** The steward's view: codes and states; no unit and no rating is among what it is given. */
export function presentTable(parts: TableParts): StewardTable {
  const ended = parts.sitting.endedAt !== null
  const { turn } = parts.sitting
  // Pouches turn ready together: the order in which they are tagged could follow the units.
  const allTagged = parts.seats.every((seat) => seat.left || seat.state !== 'waiting')
  return {
    round: {
      id: parts.round.id,
      title: parts.round.title,
      status: parts.round.status,
      blinding: parts.round.blinding,
    },
    sitting: {
      id: parts.sitting.id,
      name: parts.sitting.name,
      turn,
      turns: parts.sitting.turns,
      version: parts.sitting.version,
      ended,
    },
    seats: parts.seats.map((seat) => ({
      id: seat.id,
      label: seat.label,
      number: seat.number,
      joined: seat.joined,
      left: seat.left,
      serving:
        seat.servingId === null || seat.code === null || seat.state === null
          ? null
          : {
              id: seat.servingId,
              code: seat.code,
              state: seat.state === 'tagged' && !allTagged ? 'waiting' : seat.state,
              version: seat.servingVersion ?? 1,
              wrongCodes: seat.wrongCodes ?? 0,
              seal: seat.seal,
              restUntil: seat.restUntil?.toISOString() ?? null,
            },
      resting: turn > 0 && !ended && seat.servingId === null,
      endAnswered: seat.endAnswered,
    })),
    notSent: parts.seats
      .filter((seat) => !seat.left && (seat.state === 'handed' || seat.state === 'confirmed'))
      .map((seat) => seat.label),
    spareRows: parts.spareRows,
    serverTime: parts.now.toISOString(),
    youListen: parts.youListen,
    can: { nextTurn: !ended, addListener: !ended, end: !ended && turn >= parts.sitting.turns },
  }
}
