import type { Progress } from '#shared/contracts/rounds.ts'
import { Empty } from '#src/components/ui/Empty.tsx'

/** Who still owes something, by seat. */
export function WaitingFor({ progress }: { progress: Progress }) {
  if (progress.waitingFor.length === 0)
    return <Empty what="Nobody owes a rating." sentence="The round can be closed." />
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
