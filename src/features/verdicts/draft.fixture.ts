import type { VerdictDraft } from '#shared/contracts/verdicts.ts'
import { exampleVerdict } from './verdict.fixture.ts'

/** The desk of the example's round: Dunlin answered, Knot and Tern One not; no sentence yet. */
export const exampleDraft: VerdictDraft = {
  round: {
    id: '11111111-1111-4111-8111-111111111111',
    title: exampleVerdict.title,
    status: 'closed',
    version: 3,
  },
  label: exampleVerdict.label,
  labels: exampleVerdict.labels,
  headline: '',
  summary: '',
  sentences: exampleVerdict.sentences,
  units: exampleVerdict.units.map((unit, nth) => ({
    ...unit,
    ...(nth === 0
      ? {}
      : {
          provenance: null,
          lender: null,
          returnOn: null,
          disclosure: null,
          price: null,
          priceUnknown: false,
        }),
    version: nth + 1,
  })),
  missing: [
    { field: 'headline', what: 'The verdict’s sentence' },
    { field: 'units.1.provenance', what: 'How you got Knot' },
    { field: 'units.2.provenance', what: 'How you got Tern One' },
  ],
  published: null,
  version: 4,
  can: { publish: true },
}
