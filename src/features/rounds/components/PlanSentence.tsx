import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import type { Round } from '#shared/contracts/rounds.ts'
import { timing } from '#shared/domain/timing.ts'
import { to } from '#src/app/paths.ts'
import { counted, sentenceCase, spokenMinutes } from '#src/lib/counts.ts'
import { scorecardWords } from '../evening/plan-words.ts'

interface PlanSentenceProps {
  panel: string
  round: Round
}

/** The plan as a sentence. In a draft each number leads to the input where it is changed. */
export function PlanSentence({ panel, round }: PlanSentenceProps) {
  const edit = to('editRound', { panel, round: round.id })
  const listeners = round.people.filter((person) => person.roles.includes('panelist')).length
  const { turns, minutesPerTurn, minutes } = round.plan
  const breaks = Math.round((minutes - turns * minutesPerTurn) / timing.breakMinutes)
  const part = (words: string, place: string): ReactNode =>
    round.can.edit ? <Link to={`${edit}#${place}`}>{words}</Link> : words
  return (
    <p className="display display-plain mt-6">
      {part(sentenceCase(counted(round.unitCount, 'unit')), 'units')} for{' '}
      {part(counted(listeners, 'listener'), 'people')} in {counted(turns, 'turn')} of about {minutesPerTurn}{' '}
      minutes: {part(scorecardWords(round.scorecard.length - withLiking(round)), 'scorecard')} each time,{' '}
      {spokenMinutes(minutes)}
      {breaks > 0 && ` with ${counted(breaks, 'break')}`}.
    </p>
  )
}

const withLiking = (round: Round): number =>
  round.scorecard.some(({ family }) => family === 'liking') ? 1 : 0
