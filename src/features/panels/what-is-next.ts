import type { RoundLine } from '#shared/contracts/panels.ts'
import { to } from '#src/app/paths.ts'

export interface NextStep {
  /** The verb: "Finish the plan". */
  verb: string
  address: string
  /** Where the round is, in a sentence. */
  state: string
}

/** What a round waits for, and where that is done. */
export function nextStep(panel: string, round: RoundLine): NextStep {
  const at = { panel, round: round.id }
  switch (round.status) {
    case 'draft':
      return {
        verb: 'Look over the plan and open it',
        address: to('plan', at),
        state: 'A draft: nothing is drawn yet.',
      }
    case 'open':
      return { verb: 'Go to the evening', address: to('progress', at), state: 'Open: the cloth is on.' }
    case 'closed':
      return {
        verb: 'See how far they agreed',
        address: to('agreement', at),
        state: round.origin === 'imported' ? 'Imported: not published yet.' : 'Closed: not published yet.',
      }
    case 'published':
      return {
        verb: 'Read the verdict',
        address: round.verdictSlug ? to('verdict', { slug: round.verdictSlug }) : to('publish', at),
        state: 'Published.',
      }
    case 'cancelled':
      return { verb: 'See why', address: to('plan', at), state: 'Cancelled: no ratings are shown.' }
  }
}

const order: readonly RoundLine['status'][] = ['open', 'closed', 'draft', 'published', 'cancelled']

/** What needs a hand first: the open round, then what waits for a verdict, then drafts. */
export const byUrgency = (rounds: readonly RoundLine[]): RoundLine[] =>
  [...rounds].sort(
    (a, b) => order.indexOf(a.status) - order.indexOf(b.status) || b.changedAt.localeCompare(a.changedAt),
  )

export const needsAHand = ({ status }: RoundLine): boolean =>
  status === 'open' || status === 'closed' || status === 'draft'
