import { fixRatingsFile } from '#server/features/analysis/ratings-file-service.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { ApiError } from '#server/http/api-error.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import type { Round as RoundView } from '#shared/contracts/rounds.ts'
import * as may from '#server/policies/round.ts'
import { progressOf } from './progress-service.ts'
import { enterToChange, showRound } from './service.ts'

/**
 * Closes a round. Warns first where servings are out; then the ratings file's fingerprint is fixed, and only then does
 * the key open, all in one transaction.
 */
export async function closeRound(
  context: Context,
  at: { panel: string; round: string },
  { evenIfOut }: { evenIfOut: boolean },
): Promise<RoundView> {
  const { round } = await enterToChange(context, at, ({ facts }) => may.mayClose(facts))
  const progress = await progressOf(context, round.id)
  if (progress.servings.out > 0 && !evenIfOut) {
    const who = progress.waitingFor.map(({ seat, what }) => `${seat}: ${what}`).join('; ')
    throw new ApiError('conflict', `Still out: ${who}. What arrives after closing is kept but not counted.`)
  }
  await round.update({
    status: 'closed',
    closedAt: context.now,
    changedAt: context.now,
    version: round.version + 1,
  })
  await fixRatingsFile(context, round)
  await putOnRecord(context, 'round closed', { roundId: round.id, facts: { out: progress.servings.out } })
  await announce(context, { round: round.id })
  return showRound(context, at)
}
