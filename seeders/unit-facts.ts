import type { unitFacts } from '#shared/contracts/verdicts.ts'
import type { z } from 'zod'
import { dateFrom, type World } from './world.ts'

type Facts = z.output<typeof unitFacts>

const bought = 'Bought by the panel in a shop, at the full price.'

/** Where the invented units came from: what readers are told beside each name. Dates are from the day of seeding. */
export function factsOf(world: World, unit: string): Facts {
  const paid = (minor: number) => ({ minor, currency: 'EUR', on: dateFrom(world, -40) })
  const plain = { lender: '', returnOn: null, priceUnknown: false }
  const known: Record<string, Facts> = {
    'Tern One': { ...plain, provenance: 'bought', disclosure: bought, price: paid(2900) },
    Whimbrel: { ...plain, provenance: 'bought', disclosure: bought, price: paid(5400) },
    Godwit: { ...plain, provenance: 'bought', disclosure: bought, price: paid(11900) },
    Dunlin: {
      ...plain,
      provenance: 'loan',
      lender: 'Lantern Reed',
      returnOn: dateFrom(world, 12),
      disclosure: 'Lent by its maker, who saw nothing before this page, and due back.',
      price: paid(18900),
    },
    Avocet: {
      ...plain,
      provenance: 'loan',
      lender: 'a reader',
      returnOn: dateFrom(world, 26),
      disclosure: 'Lent by a reader, who did not listen and saw nothing before this page.',
      price: paid(24000),
    },
    Knot: {
      ...plain,
      provenance: 'gift',
      disclosure: 'Given to the panel by its maker without conditions; the panel keeps it.',
      price: paid(7900),
    },
    Fairlead: {
      ...plain,
      provenance: 'discounted',
      disclosure: 'Bought at a third off, a price that the maker offers to clubs.',
      price: { ...paid(6600), on: dateFrom(world, -90) },
    },
  }
  return (
    known[unit] ?? {
      ...plain,
      provenance: 'bought',
      disclosure: 'Bought second-hand by a member of the panel, before Scrim kept its rounds.',
      price: null,
      priceUnknown: true,
    }
  )
}
