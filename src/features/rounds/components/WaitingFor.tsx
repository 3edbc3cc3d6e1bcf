import type { Progress } from '#shared/contracts/rounds.ts'
import { Empty } from '#src/components/ui/Empty.tsx'

/** Who still owes something, by seat. */
export function WaitingFor({ progress }: { progress: Progress }) {
  const { planned, submitted } = progress.servings
  if (progress.waitingFor.length === 0)
    return submitted < planned ? (
      <Empty
        what="Nobody owes a rating just now."
        sentence={
          progress.turn === 0 ? 'The steward begins the first turn.' : 'The steward begins the next turn.'
        }
      />
    ) : (
      <Empty what="Nobody owes anything." sentence="The round can be closed." />
    )
  return (
    <ul className="rows">
      {progress.waitingFor.map(({ seat, what }) => (
        <li key={`${seat} ${what}`} className="flex flex-wrap justify-between gap-x-4 py-2">
          <span className="font-semibold">{seat}</span>
          <span className="text-muted">{what}</span>
        </li>
      ))}
    </ul>
  )
}
