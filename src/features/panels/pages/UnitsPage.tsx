import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import type { ResponseOf } from '#shared/contracts/endpoint.ts'
import type { listUnits } from '#shared/contracts/panels.ts'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { DataTable, type Column } from '#src/components/ui/DataTable.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { counted, sentenceCase } from '#src/lib/counts.ts'
import { day } from '#src/lib/dates.ts'
import { money } from '#src/lib/money.ts'
import { holds, sorted, useListState } from '#src/lib/use-list-state.ts'
import { FindField } from '../components/FindField.tsx'
import { ListPage } from '../components/ListPage.tsx'
import { panelQuery, unitsQuery } from '../queries.ts'

type Unit = ResponseOf<typeof listUnits>['units'][number]

const unsaid = <span className="text-muted">asked before publishing</span>

const columns: Column<Unit>[] = [
  { key: 'name', header: 'Unit', names: true, sortable: true, cell: (unit) => unit.name },
  {
    key: 'maker',
    header: 'Maker',
    sortable: true,
    cell: (unit) => unit.maker || <span className="text-muted">not said</span>,
  },
  { key: 'provenance', header: 'How we got it', sortable: true, cell: (unit) => unit.provenance ?? unsaid },
  {
    key: 'price',
    header: 'Price, on the day',
    numeric: true,
    cell: ({ price, provenance }) => {
      if (price) return `${money(price.minor, price.currency)}, ${day(`${price.on}T00:00:00Z`, 'UTC')}`
      // Where a unit came from is never told without its price, or that there is none.
      return provenance ? 'no price' : unsaid
    },
  },
  { key: 'rounds', header: 'Rounds', numeric: true, sortable: true, cell: (unit) => unit.rounds },
]

const values: Record<string, (unit: Unit) => string | number> = {
  name: (unit) => unit.name,
  maker: (unit) => unit.maker,
  provenance: (unit) => unit.provenance ?? '',
  rounds: (unit) => unit.rounds,
}

export default function UnitsPage() {
  const { panel = '' } = useParams()
  const known = useQuery(panelQuery(panel))
  const query = useQuery(unitsQuery(panel))
  const { sort, onSort, words, onWords } = useListState({ key: 'maker', direction: 'ascending' })
  return (
    <ListPage
      title="Units"
      label={known.data?.name ?? ''}
      note={<p>A unit is one physical earphone. Two specimens of a model are two units.</p>}
    >
      <Asked query={query} waiting="Reading the units">
        {({ units, withheld }) => {
          const shown = units.filter((unit) => holds(`${unit.maker} ${unit.name}`, words))
          return (
            <>
              {withheld > 0 && (
                <div className="mb-6">
                  <Notice title={`${sentenceCase(counted(withheld, 'unit'))} under the cloth`}>
                    You listen or steward in an open round, so its units are not shown to you until it closes.
                  </Notice>
                </div>
              )}
              {units.length === 0 ? (
                withheld === 0 && (
                  <Empty
                    what="A unit is one physical earphone."
                    sentence="Units enter the panel when an evening names them. Two specimens of a model are two units."
                    action={
                      known.data?.can.startRound && (
                        <LinkButton kind="primary" to={to('newRound', { panel })}>
                          Start an evening
                        </LinkButton>
                      )
                    }
                  />
                )
              ) : (
                <>
                  <FindField
                    label="Find a unit"
                    value={words}
                    onChange={onWords}
                    shown={shown.length}
                    total={units.length}
                  />
                  <DataTable
                    caption="The panel’s units"
                    captionHidden
                    columns={columns}
                    rows={sorted(shown, sort, values)}
                    rowKey={(unit) => unit.id}
                    sort={sort}
                    onSort={onSort}
                  />
                </>
              )}
            </>
          )
        }}
      </Asked>
    </ListPage>
  )
}
