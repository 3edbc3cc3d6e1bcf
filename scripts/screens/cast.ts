import { createSession } from '#shared/contracts/account.ts'
import { listRounds, type RoundLine } from '#shared/contracts/panels.ts'
import { getRound, listHandovers, type Handover, type Round } from '#shared/contracts/rounds.ts'
import { join } from '#shared/contracts/seats.ts'
import { demoSignIns } from '#shared/domain/demo-sign-ins.ts'
import { visit, type Visitor } from '#tests/support/visitor.ts'

export const panel = 'the-quayside-bench'

/** Who opens the pages, and what there is to open. */
export interface Cast {
  url: string
  reader: Visitor
  organiser: Visitor
  keeper: Visitor
  steward: Visitor
  /** One visitor a seat of the open round, in the order of seats. */
  listeners: readonly { visitor: Visitor; seat: string; label: string }[]
  links: readonly Handover[]
  rounds: readonly RoundLine[]
  open: Round
  /** The newest round for which `fits` holds. */
  round(fits: (line: RoundLine) => boolean): RoundLine
}

async function signedIn(url: string, place: number): Promise<Visitor> {
  const visitor = visit(url)
  const { email = '', password = '' } = demoSignIns[place] ?? {}
  await visitor.call(createSession, { body: { email, password } })
  return visitor
}

export async function castOf(url: string): Promise<Cast> {
  const [organiser, keeper, steward] = [await signedIn(url, 0), await signedIn(url, 1), await signedIn(url, 2)]
  const { rounds } = await organiser.call(listRounds, { params: { panel } })
  const round: Cast['round'] = (fits) => {
    const found = rounds.find(fits)
    if (!found) throw new Error('The demo has no such round.')
    return found
  }
  const at = { panel, round: round((line) => line.status === 'open').id }
  const open = await organiser.call(getRound, { params: at })
  const { handovers } = await organiser.call(listHandovers, { params: at })
  const listeners: { visitor: Visitor; seat: string; label: string }[] = []
  for (const link of handovers.filter((one) => one.what === 'seat')) {
    const visitor = visit(url)
    await visitor.call(join, { params: { token: link.url.split('/').at(-1) ?? '' } })
    listeners.push({ visitor, seat: link.id, label: link.label })
  }
  return {
    url,
    reader: visit(url),
    organiser,
    keeper,
    steward,
    listeners,
    links: handovers,
    rounds,
    open,
    round,
  }
}
