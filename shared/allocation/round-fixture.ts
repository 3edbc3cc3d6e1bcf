import { drawRound } from './draw.ts'
import { fingerprint, keyFile, planFile } from './key-files.ts'
import type { CodePolicy, Draw } from './types.ts'

/** One invented round of three units and five listeners, for the tests of its files and of their check. */
export const names = [
  ['u1', 'Saltmarsh Audio', 'Tern One'],
  ['u2', 'Lantern Reed', 'Dunlin'],
  ['u3', 'Eddy & Shoal', 'Whimbrel “Σ” 🎧'],
] as const

export const head = {
  round: 'round-7',
  time: '2026-03-14T18:30:00.000Z',
  versions: { draw: 'scrim-draw-1', scrim: '0.1.0' },
}
export const seed = '2d'.repeat(32)

function draw(codePolicy: CodePolicy): Draw {
  const seats = ['s-anna', 's-bo', 's-cy', 's-di', 's-ed'].map((seatRef) => ({ seatRef }))
  const units = names.map(([id]) => ({ id }))
  const result = drawRound({
    seed,
    scheme: 'scrim-draw-1',
    mode: 'turns',
    units,
    seats,
    spares: 2,
    codePolicy,
    history,
  })
  if (!result.ok) throw new Error(result.detail)
  return result.draw
}

export const history = {
  pairs: [
    { code: 417, unit: 'u2' },
    { code: 301, unit: 'u1' },
    { code: 301, unit: 'another-round' },
    { code: 417, unit: 'u2' },
  ],
  codes: [852, 203, 852],
  seats: [{ seatRef: 's-anna', codes: [913, 274] }],
}

export function files(codePolicy: CodePolicy = 'per-seat') {
  const drawn = draw(codePolicy)
  const { turns } = drawn
  const plan = planFile({
    ...head,
    nonce: '0a'.repeat(32),
    plan: {
      question: 'Which would you keep for a long journey?',
      scorecard: { name: 'Short', descriptors: ['overall liking', 'bass amount'] },
      primaryDescriptor: 'overall liking',
      rules: { fewerThanHalf: true, difference: '7.5' },
      design: { mode: 'turns', units: 3, listeners: 5, spares: 2, turns, codePolicy },
      tracks: ['Harbour bells, first minute'],
      levelMatching: 'by ear',
      hiding: 'cloth sleeves',
      blinding: codePolicy === 'split' ? 'split' : 'double',
    },
  })
  const key = keyFile({
    ...head,
    nonce: '0b'.repeat(32),
    seed,
    planDigest: plan.planDigest,
    units: names.map(([id, maker, name]) => ({ id, maker, name, serial: `S-${id}`, firmware: '' })),
    draw: drawn,
    history,
    previousKey: '7f'.repeat(32),
  })
  const ratingsText = 'panelist,code,descriptor,score\r\n'
  const fingerprints = { plan: plan.fingerprint, key: key.fingerprint, ratings: fingerprint(ratingsText) }
  return { drawn, plan, key, input: { planText: plan.text, keyText: key.text, ratingsText, fingerprints } }
}
