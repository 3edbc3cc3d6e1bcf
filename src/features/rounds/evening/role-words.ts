import type { Round } from '#shared/contracts/rounds.ts'
import { listed } from '#src/lib/counts.ts'

type Role = Round['people'][number]['roles'][number]

const words: Record<Role, string> = {
  organiser: 'organises',
  keeper: 'tags the pouches',
  letters: 'puts units into lettered pouches',
  codes: 'puts codes over the letters',
  steward: 'stewards',
  panelist: 'listens',
}

const order = Object.keys(words) as Role[]

/** What somebody does in a round: "organises, stewards and listens". */
export const dutyWords = (roles: readonly Role[]): string =>
  listed(order.filter((role) => roles.includes(role)).map((role) => words[role])) || 'is present'
