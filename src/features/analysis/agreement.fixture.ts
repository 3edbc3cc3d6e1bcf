import type { Agreement } from '#shared/contracts/analysis.ts'
import { machines } from '#src/components/results/result.fixture.ts'

/** What the organiser sees after closing; invented, but for the figures of `machines`. */
export const exampleAgreement: Agreement = {
  round: {
    id: '11111111-1111-4111-8111-111111111111',
    title: 'Three on a Tuesday',
    status: 'closed',
    origin: 'live',
    blinding: 'single',
  },
  label: { key: 'small-panel', words: 'Small panel', fewest: 6 },
  labels: ['Single-blind'],
  listeners: [
    { listener: '1', name: 'Ines Falk' },
    { listener: '2', name: 'Jory Penhale' },
    { listener: '10', name: null },
  ],
  servings: { planned: 18, counted: 17, void: 0, missing: 1, late: 0 },
  exclusions: [
    {
      listener: '2',
      rule: 'Repeats differ too much',
      reason: 'Repeats differ by 31 points.',
      excluded: false,
    },
  ],
  recognised: [{ listener: '1', code: '417', text: 'the warm one', sure: 'fairly', unit: 'B' }],
  results: [machines],
  computed: { at: '2026-11-10T20:00:00Z', digest: 'c'.repeat(64), library: '0.1.0', seed: 'scrim' },
  can: { publish: true },
}
