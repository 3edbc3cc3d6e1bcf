import { describe, expect, test } from 'vitest'
import { lexicon } from '#shared/domain/lexicon.ts'
import { evenRuns, familyScreens, mostLines, screenName } from './family-screens.ts'
import { scorecardOf } from './seat.fixture.ts'

const whole = scorecardOf(lexicon.map(({ key }) => key))

describe('a scorecard as screens', () => {
  test('overall liking comes first and alone, wherever the scorecard has it', () => {
    const screens = familyScreens([...whole].reverse())
    expect(screens[0]?.family).toBe('liking')
    expect(screens[0]?.lines.map(({ key }) => key)).toEqual(['overall-liking'])
  })

  test('no screen has more than four lines, or lines of two families, and no line is lost or shown twice', () => {
    const screens = familyScreens(whole)
    for (const screen of screens) {
      expect(screen.lines.length).toBeLessThanOrEqual(mostLines)
      expect(new Set(screen.lines.map(({ family }) => family))).toEqual(new Set([screen.family]))
    }
    const shown = screens.flatMap(({ lines }) => lines.map(({ key }) => key))
    expect([...shown].sort()).toEqual(whole.map(({ key }) => key).sort())
  })

  test('families follow in the order tonal balance, staging, timbre', () => {
    const order = [...new Set(familyScreens(whole).map(({ family }) => family))]
    expect(order).toEqual(['liking', 'tonal-balance', 'staging', 'timbre'])
  })

  test('five lines become three and two, never four and one', () => {
    expect(evenRuns([1, 2, 3, 4, 5], 4)).toEqual([
      [1, 2, 3],
      [4, 5],
    ])
    expect(evenRuns([1, 2, 3, 4], 4)).toEqual([[1, 2, 3, 4]])
  })

  test('a family on two screens says which of the two it is', () => {
    const tonal = familyScreens(whole).filter(({ family }) => family === 'tonal-balance')
    expect(tonal.map(screenName)).toEqual(['tonal balance, 1 of 2', 'tonal balance, 2 of 2'])
  })
})
