import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { roundEvents } from '#shared/contracts/rounds.ts'
import type { Tags } from '#shared/contracts/tags.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { addressOf, CallError } from '#src/lib/call.ts'
import { useLive } from '#src/lib/use-live.ts'
import { CodeTagsView, LetterTagsView } from '../components/HalfTags.tsx'
import { KeeperTagsView } from '../components/KeeperTags.tsx'
import { Printing } from '../components/Printing.tsx'
import { tagsQuery, type AtTags } from '../queries.ts'
import '../tags.css'

const titles: Record<Tags['part'], string> = {
  keeper: 'Tag the pouches',
  letters: 'Put the pairs into lettered pouches',
  codes: 'Put the codes over the letters',
}

/** The round has closed, or the duty has passed to somebody else: what is on the screen is over. */
const isRefusal = (error: unknown): error is CallError =>
  error instanceof CallError && error.problem.status < 500

const checkAfter = 30_000

function Part({ at, tags }: { at: AtTags; tags: Tags }) {
  switch (tags.part) {
    case 'keeper':
      return <KeeperTagsView at={at} tags={tags} />
    case 'letters':
      return <LetterTagsView at={at} tags={tags} />
    case 'codes':
      return <CodeTagsView at={at} tags={tags} />
  }
}

/** Behind the screen: one pouch at a time, for the keeper or one half of a split key. */
export default function TagsPage() {
  const { panel = '', round = '', sitting = '' } = useParams()
  const at = { panel, round, sitting }
  const { interval } = useLive(addressOf(roundEvents, { params: { panel, round } }), [tagsQuery(at).queryKey])
  const query = useQuery({
    ...tagsQuery(at),
    refetchInterval: interval || checkAfter,
    refetchOnWindowFocus: 'always',
    networkMode: 'always',
  })
  if (query.data && isRefusal(query.error))
    return (
      <div className="folio">
        <PageTitle size="plain">Tag the pouches</PageTitle>
        <div className="mt-4">
          <Notice title={query.error.problem.title} live>
            {query.error.problem.detail}
          </Notice>
        </div>
      </div>
    )
  return (
    <div className="folio">
      <div className="max-w-matter">
        <Asked query={query} waiting="Reading the pouches">
          {(tags) => (
            <div className="no-print">
              <div className="mb-2">
                <PageTitle size="plain">{titles[tags.part]}</PageTitle>
              </div>
              <p className="note mb-2">
                {tags.part === 'keeper'
                  ? 'Behind the screen: nobody at the table may see this page.'
                  : 'You see one half of the key. The other half is somebody else’s; neither names a code’s unit.'}
              </p>
              <Part at={at} tags={tags} />
              <Printing round={round} tags={tags} />
            </div>
          )}
        </Asked>
      </div>
    </div>
  )
}
