import { describe, expect, it } from 'vitest'
import { fingerprint } from '#shared/allocation/key-files.ts'
import { checkedWords, checkVerdict, ratedRowsOf } from './check-files.ts'

const ratings = `panelist,unit,descriptor,replicate,position,score,code
3,Dunlin,width,1,1,62,417
3,Dunlin,warmth,1,1,40,417
3,Knot,width,1,2,40,528
`
const files = [{ name: 'ratings.csv' as const, url: '/ratings.csv' }]

describe('the reader’s own check', () => {
  it('takes each listener’s code once from the ratings', async () => {
    expect(await ratedRowsOf(ratings)).toEqual([
      { listener: 3, code: 417 },
      { listener: 3, code: 528 },
    ])
  })

  it('accepts untouched ratings and refuses one changed digit', async () => {
    const published = { files, fingerprints: { plan: null, key: null, ratings: fingerprint(ratings) } }
    const [kept] = await checkVerdict(published, async () => ratings)
    const [changed] = await checkVerdict(published, async () => ratings.replace('62', '63'))
    expect(kept?.ok).toBe(true)
    expect(changed?.ok).toBe(false)
  })

  it('sums the checks up in one sentence', () => {
    const check = (ok: boolean) => ({ name: 'a', ok, detail: '' })
    expect(checkedWords([check(true), check(true)])).toMatch(/^All 2 checks passed/)
    expect(checkedWords([check(true), check(false)])).toBe('1 of 2 checks failed.')
    expect(checkedWords([])).toBe('There is nothing that could be checked.')
  })
})
