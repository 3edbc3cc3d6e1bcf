import type { Page } from 'playwright-core'
import * as seats from '#shared/contracts/seats.ts'
import { getTable, nextTurn } from '#shared/contracts/table.ts'
import { to } from '#src/app/paths.ts'
import { panel, type Cast } from './cast.ts'
import { press, type Shot } from './shot.ts'

type Listener = Cast['listeners'][number]
const stepOf = async ({ visitor, seat }: Listener): Promise<string> =>
  (await visitor.call(seats.getSeat, { params: { seat } })).step

/** A seat that stands at this step now; found once, so that its pictures follow each other. */
async function seatAt(cast: Cast, ...steps: string[]): Promise<Listener> {
  for (const listener of cast.listeners) if (steps.includes(await stepOf(listener))) return listener
  throw new Error(`No seat is at ${steps.join(' or ')} now.`)
}
const latecomer = (cast: Cast): Listener => {
  const found = cast.listeners.find(({ label }) => label === 'Lorcan Weir')
  if (!found) throw new Error('The latecomer has no seat.')
  return found
}
const who = (cast: Cast) => latecomer(cast).visitor
const addressOf = ({ seat }: Listener): string => to('seat', { seat })

/** Brings the latecomer as far as `step`: consent, the digits, the seal, the first line. */
async function bring(cast: Cast, step: 'enter-code' | 'seal' | 'rate'): Promise<string> {
  const listener = latecomer(cast)
  const { visitor, seat } = listener
  const at = { panel, round: cast.open.id, sitting: cast.open.sittingId ?? '' }
  const params = { seat }
  if ((await stepOf(listener)) === 'consent')
    await visitor.call(seats.giveConsent, { params, body: { version: seats.consentVersion, adult: true } })
  if (step !== 'enter-code' && (await stepOf(listener)) === 'enter-code') {
    const { seats: rows } = await cast.steward.call(getTable, { params: at })
    const held = rows.find(({ id }) => id === seat)?.serving
    if (!held) throw new Error('The latecomer holds nothing.')
    const serving = { seat, serving: held.id }
    await visitor.call(seats.confirmCode, { params: serving, body: { code: held.code } })
  }
  if (step === 'rate' && (await stepOf(listener)) === 'seal') {
    const { serving } = await visitor.call(seats.getSeat, { params })
    await visitor.call(seats.checkSeal, { params: { seat, serving: serving?.id ?? '' }, body: { sealed: 'yes' } })
  }
  return addressOf(listener)
}

/** Answers the first lines of a screen and leaves the last one untouched unless `all`. */
async function answer(page: Page, all: boolean): Promise<void> {
  const lines = page.getByRole('slider')
  const count = await lines.count()
  for (let nth = 0; nth < (all || count < 2 ? count : count - 1); nth++) {
    await lines.nth(nth).focus()
    for (let step = 0; step < 3 - nth; step++) await page.keyboard.press(nth % 2 ? 'PageDown' : 'PageUp')
  }
}

/** Goes on from the first line to the screen whose number it is, answering all before it. */
async function walkTo(page: Page, screen: number): Promise<void> {
  for (let at = 0; at < screen; at++) {
    await answer(page, true)
    const next = page.getByRole('button', { name: /^Next: / })
    const words = (await next.textContent()) ?? ''
    await next.click()
    await page.getByRole('button', { name: words, exact: true }).waitFor({ state: 'hidden' })
  }
}

async function endSitting(cast: Cast): Promise<void> {
  const params = { panel, round: cast.open.id, sitting: cast.open.sittingId ?? '' }
  for (;;) {
    const { sitting } = await cast.steward.call(getTable, { params })
    if (sitting.ended) return
    await cast.steward.call(nextTurn, { params, body: { from: sitting.turn } })
  }
}

/** What a listener sees, in the order of an evening: the pictures follow each other on the same seats. */
export const seatShots: readonly Shot[] = [
  { name: 'seat-coming-up', path: 'seat', who, go: (cast) => addressOf(latecomer(cast)) },
  {
    name: 'seat-consent',
    path: 'seat',
    who,
    go: (cast) => addressOf(latecomer(cast)),
    then: (page) => press(page, 'Go on'),
  },
  {
    name: 'seat-waiting',
    path: 'seat',
    who: (cast) => cast.listeners[0]!.visitor,
    go: async (cast) => addressOf(await seatAt(cast, 'waiting', 'sent', 'rest')),
  },
  { name: 'seat-code', path: 'seat', who, go: (cast) => bring(cast, 'enter-code') },
  {
    name: 'seat-code-wrong',
    path: 'seat',
    who,
    go: (cast) => bring(cast, 'enter-code'),
    then: async (page) => {
      await page.getByLabel('Digits').fill('100')
      await press(page, 'This is my pouch')
      await page.waitForTimeout(1000)
    },
  },
  { name: 'seat-seal', path: 'seat', who, go: (cast) => bring(cast, 'seal') },
  { name: 'seat-liking', path: 'seat', who, go: (cast) => bring(cast, 'rate') },
  {
    name: 'seat-family',
    path: 'seat',
    who,
    go: (cast) => bring(cast, 'rate'),
    then: async (page) => {
      await walkTo(page, 1)
      await answer(page, false)
    },
  },
  {
    name: 'seat-review',
    path: 'seat',
    who,
    go: (cast) => bring(cast, 'rate'),
    then: (page) => walkTo(page, 5),
  },
  {
    name: 'seat-rest',
    path: 'seat',
    who,
    go: (cast) => bring(cast, 'rate'),
    then: async (page) => {
      await walkTo(page, 5)
      await press(page, 'Send this serving')
      await page.getByRole('button', { name: 'Send this serving' }).waitFor({ state: 'hidden' })
      await page.waitForTimeout(500)
    },
  },
  {
    name: 'seat-end',
    path: 'seat',
    who,
    go: async (cast) => {
      await bring(cast, 'enter-code')
      await endSitting(cast)
      return addressOf(latecomer(cast))
    },
  },
  {
    name: 'seat-thanks',
    path: 'seat',
    who,
    go: async (cast) => {
      await bring(cast, 'enter-code')
      await endSitting(cast)
      const { visitor, seat } = latecomer(cast)
      await visitor.call(seats.answerEnd, {
        params: { seat },
        body: { recognised: 'none', recognitions: [] },
      })
      return addressOf(latecomer(cast))
    },
  },
]
