import { useQuery } from '@tanstack/react-query'
import { Link, useParams } from 'react-router-dom'
import type { RoundLine } from '#shared/contracts/panels.ts'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { DataTable, type Column } from '#src/components/ui/DataTable.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { day } from '#src/lib/dates.ts'
import { holds, sorted, useListState } from '#src/lib/use-list-state.ts'
import { FindField } from '../components/FindField.tsx'
import { ListPage } from '../components/ListPage.tsx'
import { panelQuery, roundsQuery } from '../queries.ts'
import { nextStep } from '../what-is-next.ts'

const blindingWords: Record<RoundLine['blinding'], string> = {
  double: 'a keeper tags',
  single: 'single-blind',
  split: 'split key',
  imported: 'imported',
}

const columns = (panel: string, zone: string | undefined): Column<RoundLine>[] => [
  {
    key: 'title',
    header: 'Round',
    names: true,
    sortable: true,
    cell: (round) => <Link to={nextStep(panel, round).address}>{round.title}</Link>,
  },
  { key: 'number', header: 'No.', numeric: true, sortable: true, cell: (round) => round.number },
  { key: 'status', header: 'Where it is', sortable: true, cell: (round) => round.status },
  { key: 'blinding', header: 'Blinding', cell: (round) => blindingWords[round.blinding] },
  { key: 'listeners', header: 'Listeners', numeric: true, sortable: true, cell: (round) => round.listeners },
  { key: 'changed', header: 'Last change', sortable: true, cell: (round) => day(round.changedAt, zone) },
]

const values: Record<string, (round: RoundLine) => string | number> = {
  title: (round) => round.title,
  number: (round) => round.number,
  status: (round) => round.status,
  listeners: (round) => round.listeners,
  changed: (round) => round.changedAt,
}

export default function RoundsPage() {
  const { panel = '' } = useParams()
  const known = useQuery(panelQuery(panel))
  const query = useQuery(roundsQuery(panel))
  const { sort, onSort, words, onWords } = useListState({ key: 'number', direction: 'descending' })
  const start = known.data?.can.startRound && (
    <LinkButton kind="primary" to={to('newRound', { panel })}>
      Start an evening
    </LinkButton>
  )
  const any = (query.data?.rounds.length ?? 0) > 0
  return (
    <ListPage title="Rounds" label={known.data?.name ?? ''} action={any && start}>
      <Asked query={query} waiting="Reading the rounds">
        {({ rounds }) => {
          if (rounds.length === 0)
            return (
              <Empty
                what="A round is one blind comparison."
                sentence="Three to six units, two listeners or more, one evening."
                action={start}
              />
            )
          const shown = rounds.filter((round) => holds(`${round.title} ${round.status}`, words))
          return (
            <>
              <FindField
                label="Find a round"
                value={words}
                onChange={onWords}
                shown={shown.length}
                total={rounds.length}
              />
              <DataTable
                caption="The panel’s rounds"
                captionHidden
                columns={columns(panel, known.data?.timeZone)}
                rows={sorted(shown, sort, values)}
                rowKey={(round) => round.id}
                sort={sort}
                onSort={onSort}
              />
            </>
          )
        }}
      </Asked>
    </ListPage>
  )
}
