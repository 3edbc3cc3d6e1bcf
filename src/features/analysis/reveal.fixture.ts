import type { Reveal } from '#shared/contracts/analysis.ts'

/** Six listeners, three units of which nobody could rate the last; invented numbers. */
export const exampleReveal: Reveal = {
  title: 'Three earphones on a Tuesday',
  descriptor: {
    key: 'width',
    name: 'Width',
    family: 'staging',
    sentence: 'How far sounds spread left and right',
    scale: { low: 0, high: 100, step: 1 },
    sided: 'one',
    words: { low: 'inside the head', middle: null, high: 'well outside the ears' },
  },
  label: 'Small panel: 6 listeners',
  units: [
    { maker: 'Saltmarsh Audio', name: 'Tern One', codes: ['417', '528'], median: 41, q1: 33, q3: 47, n: 6 },
    { maker: 'Lantern Reed', name: 'Dunlin', codes: ['936'], median: 72, q1: 64, q3: 78, n: 6 },
    { maker: 'Eddy & Shoal', name: 'Avocet', codes: ['275'], median: null, q1: null, q3: null, n: 0 },
  ],
  threads: [
    { values: [33, 64, null] },
    { values: [38, 78, null] },
    { values: [44, 70, null] },
    { values: [47, 74, null] },
    { values: [29, 81, null] },
    { values: [50, 60, null] },
  ],
  sentence: 'Dunlin is rated wider than Tern One; difference 31, between 20 and 42.',
}
