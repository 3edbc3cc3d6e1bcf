import { expect, it } from 'vitest'
import { citation } from './citation.ts'

const verdict = {
  panelName: 'The Quayside Bench',
  headline: 'Dunlin is the widest of six.',
  title: 'Six earphones under 250',
  publishedAt: '2026-11-12T18:00:00Z',
  version: 2,
  number: 7,
}

it('cites the panel, the day, the sentence, the version and the short address', () => {
  expect(citation(verdict, 'https://scrim.example')).toBe(
    'The Quayside Bench (12 November 2026). Dunlin is the widest of six. Blind listening verdict 7, version 2. https://scrim.example/v/7',
  )
})

it('cites the title where there is no sentence', () => {
  expect(citation({ ...verdict, headline: '' }, '')).toContain('Six earphones under 250. Blind')
})
