import { getRound } from '#shared/contracts/rounds.ts'
import { sheets } from '#seeders/old-sheets.ts'
import { to } from '#src/app/paths.ts'
import { panel, type Cast } from './cast.ts'
import { organiser, press, type Shot } from './shot.ts'

const roundIn = (cast: Cast, status: string): { panel: string; round: string } => ({
  panel,
  round: cast.round((line) => line.status === status && line.origin === 'live').id,
})
const atSix = (cast: Cast): { panel: string; round: string } => ({
  panel,
  round: cast.round((line) => line.title.startsWith('Six small')).id,
})
const atTable = (cast: Cast) => ({ panel, round: cast.open.id, sitting: cast.open.sittingId ?? '' })

/** What the people of a panel open. */
export const panelShots: readonly Shot[] = [
  { name: 'account', path: 'account', who: organiser, go: () => to('account') },
  { name: 'panel', path: 'panel', who: organiser, go: () => to('panel', { panel }) },
  { name: 'units', path: 'units', who: organiser, go: () => to('units', { panel }) },
  { name: 'people', path: 'people', who: organiser, go: () => to('people', { panel }) },
  { name: 'settings', path: 'settings', who: organiser, go: () => to('settings', { panel }) },
  { name: 'rounds', path: 'rounds', who: organiser, go: () => to('rounds', { panel }) },
  { name: 'newRound', path: 'newRound', who: organiser, go: () => to('newRound', { panel }) },
  {
    name: 'newRound-faults',
    path: 'newRound',
    who: organiser,
    go: () => to('newRound', { panel }),
    then: async (page) => {
      await page.getByLabel('Maker of unit 1').fill('Saltmarsh Audio')
      await press(page, 'Look over the plan')
      await page.waitForTimeout(800)
    },
  },
  { name: 'editRound', path: 'editRound', who: organiser, go: (cast) => to('editRound', roundIn(cast, 'draft')) },
  { name: 'importRound', path: 'importRound', who: organiser, go: () => to('importRound', { panel }) },
  {
    name: 'importRound-preview',
    path: 'importRound',
    who: organiser,
    go: () => to('importRound', { panel }),
    then: async (page) => {
      const bad = sheets().replace(/(Reader B,.*),[\d.]+\n/, '$1,seven\n')
      await page
        .getByLabel('Ratings file')
        .setInputFiles({ name: 'old-sheets.csv', mimeType: 'text/csv', buffer: Buffer.from(bad) })
      await page.getByRole('heading', { name: 'What was read' }).waitFor()
      await page.waitForTimeout(300)
    },
  },
  { name: 'plan-draft', path: 'plan', who: organiser, go: (cast) => to('plan', roundIn(cast, 'draft')) },
  { name: 'plan-open', path: 'plan', who: organiser, go: (cast) => to('plan', roundIn(cast, 'open')) },
  { name: 'plan-cancelled', path: 'plan', who: organiser, go: (cast) => to('plan', roundIn(cast, 'cancelled')) },
  { name: 'progress', path: 'progress', who: organiser, go: (cast) => to('progress', roundIn(cast, 'open')) },
  { name: 'links', path: 'links', who: organiser, go: (cast) => to('links', roundIn(cast, 'open')) },
  { name: 'table', path: 'table', who: (cast) => cast.steward, go: (cast) => to('table', atTable(cast)) },
  {
    name: 'table-seat',
    path: 'table',
    who: (cast) => cast.steward,
    go: (cast) => to('table', atTable(cast)),
    then: async (page) => {
      await page.locator('main li button, main tr button').first().click()
      await page.getByRole('dialog').waitFor()
    },
  },
  { name: 'tags', path: 'tags', who: (cast) => cast.keeper, go: (cast) => to('tags', atTable(cast)) },
  { name: 'agreement', path: 'agreement', who: organiser, go: (cast) => to('agreement', atSix(cast)) },
  {
    name: 'agreement-closed',
    path: 'agreement',
    who: organiser,
    go: (cast) => to('agreement', roundIn(cast, 'closed')),
  },
  { name: 'reveal-covered', path: 'reveal', who: organiser, go: (cast) => to('reveal', roundIn(cast, 'closed')) },
  {
    name: 'reveal-middle',
    path: 'reveal',
    who: organiser,
    go: (cast) => `${to('reveal', atSix(cast))}?step=3`,
  },
  {
    name: 'reveal-all',
    path: 'reveal',
    who: organiser,
    go: (cast) => `${to('reveal', atSix(cast))}?step=99`,
  },
  { name: 'publish', path: 'publish', who: organiser, go: (cast) => to('publish', roundIn(cast, 'closed')) },
  { name: 'publish-again', path: 'publish', who: organiser, go: (cast) => to('publish', atSix(cast)) },
  {
    name: 'seat-report',
    path: 'seat',
    who: (cast) => cast.steward,
    go: async (cast) => {
      const { you } = await cast.steward.call(getRound, { params: atSix(cast) })
      return to('seat', { seat: you.seatId ?? '' })
    },
  },
]
