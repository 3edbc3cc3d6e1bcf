import type { SeatReport } from '#shared/contracts/seats.ts'
import { countedRatings } from '#server/features/analysis/ratings-service.ts'
import { describeRound } from '#server/features/rounds/listener-service.ts'
import { unitsOf } from '#server/features/rounds/facts-service.ts'
import { verdictSlugOf } from '#server/features/rounds/view-service.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { hinges } from '#shared/stats/median.ts'
import { maySeeOwnReport } from '#server/policies/seat.ts'
import { enterSeat } from './access-service.ts'

/** After closing: what this listener rated, revealed, beside the panel's median. */
export async function ownReport(context: Context, id: string): Promise<SeatReport> {
  const { seat, round, facts } = await enterSeat(context, id)
  permit(maySeeOwnReport(facts), { detail: 'Your report is here once the round has closed.' })
  const ratings = await countedRatings(context, round)
  const { scorecard } = await describeRound(round)
  const units = await unitsOf(round)
  const mine = ratings.filter((one) => one.seatId === seat.id)
  return {
    label: seat.label,
    roundTitle: round.title,
    scorecard,
    units: units.flatMap((unit) => {
      const own = mine.filter((one) => one.unitId === unit.id)
      const code = own[0]?.code
      if (code === undefined) return []
      return [
        {
          maker: unit.maker,
          name: unit.name,
          code,
          ratings: scorecard.map(({ key }) => {
            const all = ratings.filter((one) => one.unitId === unit.id && one.descriptor === key)
            const scores = all.flatMap((one) => (one.value === null ? [] : [one.value]))
            const yours = own.find((one) => one.descriptor === key)
            return {
              descriptor: key,
              yours: yours?.value ?? null,
              cantTell: yours?.cantTell ?? false,
              panelMedian: scores.length === 0 ? null : hinges(scores).median,
              n: scores.length,
            }
          }),
        },
      ]
    }),
    verdictSlug: round.status === 'published' ? await verdictSlugOf(round.id) : null,
  }
}
