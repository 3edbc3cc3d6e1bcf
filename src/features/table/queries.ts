import { getRound } from '#shared/contracts/rounds.ts'
import { getTable } from '#shared/contracts/table.ts'
import { ask } from '#src/lib/ask.ts'

export interface AtTable {
  panel: string
  round: string
  sitting: string
}

/** The steward's table: codes and states. */
export const tableQuery = (params: AtTable) => ask(getTable, { params })

/** The round as the steward sees it; for the steward's own seat and the way to the links. */
export const roundQuery = ({ panel, round }: AtTable) => ask(getRound, { params: { panel, round } })
