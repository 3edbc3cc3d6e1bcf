import { screen, waitFor } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { afterEach, describe, expect, test, vi } from 'vitest'
import { getPublicRound, type PublicRound } from '#shared/contracts/rounds.ts'
import { getTags, markTagged, type Tags } from '#shared/contracts/tags.ts'
import { paths, to } from '#src/app/paths.ts'
import { fakeServer, showPage } from '#tests/support/show-page.tsx'
import TagsPage from './TagsPage.tsx'

const round = '9f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b'
const at = { panel: 'quayside-bench', round, sitting: '5f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b' }
const servings = ['8f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a51', '8f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a52'] as const
const show = () => showPage(TagsPage, paths.tags.pattern, to('tags', at))
/** The pouch in hand, which is announced when it changes. */
const inHand = () => screen.getAllByRole('status').find((one) => one.classList.contains('pouch'))

const opened: PublicRound = {
  id: round,
  panelName: 'The Quayside Bench',
  title: 'Two in the dark',
  question: 'Which one stays?',
  status: 'open',
  blinding: 'double',
  openedAt: '2031-03-14T19:30:00.000Z',
  closedAt: null,
  cancelledAt: null,
  cancelReason: null,
  unitCount: 2,
  listeners: 2,
  scorecard: [],
  primaryDescriptor: 'overall-liking',
  tracks: [],
  levelMatching: 'by-ear',
  hiding: 'Sleeves',
  turns: 2,
  planFingerprint: '0'.repeat(64),
  keyFingerprint: '0'.repeat(64),
  verdictSlug: null,
  keyIsPublic: false,
}

afterEach(() => {
  vi.unstubAllGlobals()
  vi.restoreAllMocks()
})

const keeper = (): Extract<Tags, { part: 'keeper' }> => ({
  part: 'keeper',
  turn: 0,
  turns: 2,
  pouches: [
    {
      serving: servings[0],
      seat: 'Seat 1',
      turn: 1,
      code: '417',
      maker: 'Saltmarsh Audio',
      unit: 'Dunlin',
      state: 'to-tag',
    },
    {
      serving: servings[1],
      seat: 'Seat 2',
      turn: 1,
      code: '528',
      maker: 'Lantern Reed',
      unit: 'Knot',
      state: 'to-tag',
    },
  ],
  reserves: [],
})

describe('behind the screen', () => {
  test('the keeper sees one pouch at a time and comes to the next by tagging it', async () => {
    let tags = keeper()
    const server = fakeServer()
      .on(getTags, () => tags)
      .on(markTagged, ({ body }) => {
        const { serving } = body as { serving: string }
        tags = {
          ...tags,
          pouches: tags.pouches.map((one) => (one.serving === serving ? { ...one, state: 'tagged' } : one)),
        }
        return { done: true as const }
      })
    show()
    await screen.findByRole('button', { name: 'Tagged' })
    expect(inHand()).toHaveTextContent(/Dunlin.*Saltmarsh Audio.*417.*for Seat 1, turn 1/)
    await userEvent.click(screen.getByRole('button', { name: 'Tagged' }))
    await waitFor(() => expect(inHand()).toHaveTextContent(/Knot.*528/))
    await userEvent.click(screen.getByRole('button', { name: 'Tagged' }))
    await screen.findByText('Every pouch is tagged')
    expect(server.asked('markTagged').map(({ body }) => body)).toEqual([
      { serving: servings[0] },
      { serving: servings[1] },
    ])
  })

  test('a pair that is still out cannot be tagged, and the page says with whom it is', async () => {
    const tags = keeper()
    const [first, second] = tags.pouches
    if (!first || !second) throw new Error('two pouches')
    fakeServer().on(getTags, () => ({
      ...tags,
      pouches: [
        { ...first, state: 'out' as const },
        { ...second, maker: first.maker, unit: first.unit, turn: 2 },
      ],
    }))
    show()
    expect(await screen.findByText(/still with Seat 1 under 417/)).toBeVisible()
    expect(screen.getByRole('button', { name: 'Tagged' })).toHaveAttribute('aria-disabled', 'true')
  })

  test('the first half of a split key sees units and letters', async () => {
    const server = fakeServer()
      .on(getTags, () => ({
        part: 'letters' as const,
        pouches: [{ letter: 'B', maker: 'Eddy & Shoal', unit: 'Godwit', done: false }],
      }))
      .on(markTagged, () => ({ done: true as const }))
    show()
    await userEvent.click(await screen.findByRole('button', { name: 'In pouch B' }))
    await waitFor(() => expect(server.asked('markTagged')[0]?.body).toEqual({ letter: 'B' }))
    expect(document.body.textContent).not.toMatch(/[1-9]\d\d/)
  })

  test('the second half of a split key sees letters and codes', async () => {
    fakeServer().on(getTags, () => ({
      part: 'codes' as const,
      pouches: [{ letter: 'B', code: '417', reserve: '528', done: false }],
    }))
    show()
    await screen.findByRole('button', { name: 'Tagged' })
    expect(inHand()).toHaveTextContent(/Pouch B.*417/)
  })

  test('cards to cut out carry digits and the round’s sign, no unit; the sheet carries both', async () => {
    const print = vi.spyOn(window, 'print').mockImplementation(() => undefined)
    const [plan, key] = ['1'.repeat(64), '2'.repeat(64)]
    const server = fakeServer()
      .on(getTags, keeper)
      .on(getPublicRound, () => ({ ...opened, planFingerprint: plan, keyFingerprint: key }))
    show()
    await waitFor(() => expect(server.asked('getPublicRound')).toHaveLength(1))
    await userEvent.click(await screen.findByRole('button', { name: 'Print the cards' }))
    const paper = () => document.querySelector('.print-only')?.textContent ?? ''
    expect(print).toHaveBeenCalledTimes(1)
    expect(paper()).toMatch(/417.*9F2B1A.*528/)
    expect(paper()).not.toMatch(/Dunlin|Knot/)
    await userEvent.click(screen.getByRole('button', { name: 'Print the sheet' }))
    expect(paper()).toMatch(/Dunlin/)
    await waitFor(() => expect(paper()).toContain(`plan.json ${plan}`))
    expect(paper()).toContain(`key.json ${key}`)
    expect(print).toHaveBeenCalledTimes(2)
  })
})
