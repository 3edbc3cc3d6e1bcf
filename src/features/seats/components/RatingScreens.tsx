import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { familyScreens, laterFamilies, screenName } from '../family-screens.ts'
import type { Keeping, KeepingState } from '../keeping/keeping.ts'
import { keptStart, type Change, type KeptServing, type Place } from '../keeping/kept-serving.ts'
import { keptWords } from '../kept-words.ts'
import { RatingFamily } from './RatingFamily.tsx'
import { RemarkScreen } from './RemarkScreen.tsx'
import { ReviewScreen } from './ReviewScreen.tsx'

interface RatingScreensProps {
  seat: PanelistSeat
  place: Place
  keeping: Keeping
  state: KeepingState
  kept: KeptServing | undefined
}

/** One serving's rating: overall liking, the families, a remark, a last look. Every touch is kept on the phone. */
export function RatingScreens({ seat, place, keeping, state, kept = keptStart(place) }: RatingScreensProps) {
  const screens = familyScreens(seat.scorecard)
  const remarkAt = screens.length
  const reviewAt = screens.length + 1
  const at = Math.min(kept.screen, reviewAt)
  const change = (what: Change) => keeping.change(place, what)
  const go = (screen: number) => change({ screen })
  const screen = screens[at]
  const frame = {
    seat,
    kept: keptWords(state, state.records.get(kept.id)),
    within: at / (reviewAt + 1),
  }
  if (screen) {
    const next = screens[at + 1]
    const before = screens[at - 1]
    return (
      <RatingFamily
        key={at}
        frame={frame}
        screen={screen}
        position={{ at: at + 1, of: screens.length, later: laterFamilies(screens, at) }}
        answers={kept.answers}
        onAnswer={(line, answer) => change({ answers: { [line]: answer } })}
        next={{ name: next ? `Next: ${screenName(next)}` : 'Next: a remark', go: () => go(at + 1) }}
        back={before && { name: `Back to ${screenName(before)}`, go: () => go(at - 1) }}
      />
    )
  }
  if (at === remarkAt)
    return (
      <RemarkScreen
        frame={frame}
        remark={kept.remark}
        onRemark={(remark) => change({ remark })}
        onNext={() => go(reviewAt)}
        onBack={() => go(at - 1)}
      />
    )
  return (
    <ReviewScreen
      frame={frame}
      kept={kept}
      screens={screens}
      saving={state.saving}
      onScreen={go}
      onRemark={() => go(remarkAt)}
      onSubmit={() => void keeping.submit(place)}
    />
  )
}
