import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { Asked } from '#src/components/asked/Asked.tsx'
import { meQuery } from '#src/lib/me.ts'
import { Desk } from '../components/Desk.tsx'
import { draftQuery, roundQuery } from '../queries.ts'

/** The reader's own day as `2026-11-12`. */
const ownDay = (now: Date): string =>
  [now.getFullYear(), now.getMonth() + 1, now.getDate()]
    .map((part) => String(part).padStart(2, '0'))
    .join('-')

/** Before publishing: what readers must know of each unit, the words, a preview; then publish, later correct. */
export default function PublishPage() {
  const { panel = '', round = '' } = useParams()
  const at = { panel, round }
  const record = useQuery(roundQuery(at))
  const desk = useQuery(draftQuery(at))
  const { data: me } = useQuery(meQuery)
  return (
    <Asked query={record} waiting="Reading the round">
      {(found) => (
        <Asked query={desk} waiting="Reading what is known so far">
          {(draft) => (
            <Desk
              at={at}
              draft={draft}
              round={found}
              panelName={me?.panels.find((one) => one.slug === panel)?.name ?? ''}
              today={ownDay(new Date())}
            />
          )}
        </Asked>
      )}
    </Asked>
  )
}
