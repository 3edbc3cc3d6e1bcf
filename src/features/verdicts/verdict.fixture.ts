import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import { machines } from '#src/components/results/result.fixture.ts'

const unit = (nr: number, name: string, maker: string) => ({
  id: `00000000-0000-4000-8000-00000000000${nr}`,
  maker,
  name,
  provenance: 'bought' as const,
  lender: null,
  returnOn: null,
  disclosure: `${name} was bought by the panel at the usual price.`,
  price: { minor: 5400, currency: 'EUR', on: '2026-11-03' },
  priceUnknown: false,
  photo: null,
})

/** Six listeners, three units, one descriptor; invented, but for the figures of `machines`. */
export const exampleVerdict: PublicVerdict = {
  slug: 'three-earphones-on-a-tuesday',
  number: 7,
  version: 2,
  publishedAt: '2026-11-12T18:00:00Z',
  panelName: 'The Quayside Bench',
  title: 'Three earphones on a Tuesday',
  question: 'Which sounds widest?',
  headline: 'Dunlin is rated higher than Knot.',
  summary: 'Six listeners on one evening.',
  sentences: ['Dunlin is rated higher than Knot; difference 13.92, between 7.95 and 19.88.'],
  certainty: ['This panel cannot say how far listeners agree: only three units.'],
  label: { key: 'small-panel', words: 'Small panel', fewest: 6 },
  labels: ['Single-blind'],
  disclosures: ['Dunlin is on loan from a shop until 30 November 2026.'],
  units: [
    {
      ...unit(1, 'Dunlin', 'Lantern Reed'),
      provenance: 'loan',
      lender: 'a shop',
      returnOn: '2026-11-30',
      disclosure: 'Dunlin is on loan from a shop until 30 November 2026.',
      photo: {
        id: '00000000-0000-4000-8000-0000000000aa',
        url: '/api/photos/00000000-0000-4000-8000-0000000000aa',
        width: 640,
        height: 480,
      },
    },
    unit(2, 'Knot', 'Eddy & Shoal'),
    { ...unit(3, 'Tern One', 'Saltmarsh Audio'), price: null, priceUnknown: true },
  ],
  results: [machines],
  method: {
    origin: 'live',
    blinding: 'single',
    openedAt: '2026-11-10T17:00:00Z',
    closedAt: '2026-11-10T20:00:00Z',
    listeners: 6,
    turns: 6,
    scorecard: [machines.descriptor],
    primaryDescriptor: 'score',
    tracks: ['Harbour bells: the decay of the largest'],
    sourceChain: 'One dongle, one phone',
    levelMatching: 'by-ear',
    hiding: 'Blindfold and the same dark cable sleeve',
    servings: { planned: 18, counted: 18, void: 0, missing: 0, late: 0 },
    exclusions: [],
    library: '0.1.0',
    seed: 'scrim',
  },
  limits: ['These listeners, that evening, these tips, that chain.'],
  fingerprints: { plan: 'a'.repeat(64), key: 'b'.repeat(64), ratings: 'c'.repeat(64) },
  files: [
    { name: 'plan.json', url: '/api/verdicts/three-earphones-on-a-tuesday/files/plan.json' },
    { name: 'key.json', url: '/api/verdicts/three-earphones-on-a-tuesday/files/key.json' },
    { name: 'ratings.csv', url: '/api/verdicts/three-earphones-on-a-tuesday/files/ratings.csv' },
    {
      name: 'data-dictionary.txt',
      url: '/api/verdicts/three-earphones-on-a-tuesday/files/data-dictionary.txt',
    },
  ],
  corrections: [
    { version: 2, at: '2026-11-13T09:00:00Z', note: 'Wrong: Knot on loan. Right: Knot was bought.' },
  ],
}
