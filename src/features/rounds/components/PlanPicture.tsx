import type { Round } from '#shared/contracts/rounds.ts'
import { PlanRows } from '#src/components/charts/PlanRows.tsx'
import { counted, sentenceCase } from '#src/lib/counts.ts'

/** When each row hears something. Who sits in a row and which unit stands in a place, the draw decides. */
export function PlanPicture({ round }: { round: Round }) {
  const { rows, turns } = round.plan
  const rests = rows.some((row) => row.turns.length < turns)
  const sentence = [
    `${sentenceCase(counted(turns, 'turn'))} in step: in each, no two people hold one unit.`,
    rests ? 'Where a thread is dotted, its listener rests.' : 'Nobody rests.',
    round.status === 'draft'
      ? 'Who takes which row, and which unit stands where, is drawn at opening, so that each unit comes early and late alike.'
      : 'Which unit stands where is in the key.',
  ]
  return (
    <PlanRows
      heading="h2"
      title="Who hears something when"
      sentence={sentence.join(' ')}
      turns={turns}
      rows={rows.map((row, nth) => ({
        name: `Row ${nth + 1}`,
        places: row.turns.map((turn) => ({ turn })),
      }))}
    />
  )
}
