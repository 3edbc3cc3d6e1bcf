import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import type { ResponseOf } from '#shared/contracts/endpoint.ts'
import type { listMembers } from '#shared/contracts/panels.ts'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { DataTable, type Column } from '#src/components/ui/DataTable.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { holds, sorted, useListState } from '#src/lib/use-list-state.ts'
import { FindField } from '../components/FindField.tsx'
import { ListPage } from '../components/ListPage.tsx'
import { membersQuery, panelQuery } from '../queries.ts'

type Member = ResponseOf<typeof listMembers>['members'][number]

const columns: Column<Member>[] = [
  { key: 'name', header: 'Name', names: true, sortable: true, cell: (member) => member.name },
  {
    key: 'roles',
    header: 'In this panel',
    sortable: true,
    cell: (member) => member.roles.join(', ') || 'listener',
  },
  {
    key: 'signsIn',
    header: 'Comes in by',
    sortable: true,
    cell: (member) => (member.signsIn ? 'signing in' : 'a link for the evening'),
  },
]

const values: Record<string, (member: Member) => string> = {
  name: (member) => member.name,
  roles: (member) => member.roles.join(', '),
  signsIn: (member) => String(member.signsIn),
}

export default function PeoplePage() {
  const { panel = '' } = useParams()
  const known = useQuery(panelQuery(panel))
  const query = useQuery(membersQuery(panel))
  const { sort, onSort, words, onWords } = useListState({ key: 'name', direction: 'ascending' })
  return (
    <ListPage
      title="People"
      label={known.data?.name ?? ''}
      note={
        <p>
          Names never leave the panel. A published file knows its listeners by numbers that were drawn when
          the round opened.
        </p>
      }
    >
      <Asked query={query} waiting="Reading the people">
        {({ members }) => {
          const shown = members.filter((member) => holds(member.name, words))
          return (
            <>
              <FindField
                label="Find a person"
                value={words}
                onChange={onWords}
                shown={shown.length}
                total={members.length}
              />
              {members.length > 0 && (
                <DataTable
                  caption="The people of the panel"
                  captionHidden
                  columns={columns}
                  rows={sorted(shown, sort, values)}
                  rowKey={(member) => member.id}
                  sort={sort}
                  onSort={onSort}
                />
              )}
              {members.length < 2 && (
                <div className="mt-6">
                  <Empty
                    what="A member is a person in the panel, with or without an account."
                    sentence="Name those who are present when you start an evening, and they stand here afterwards."
                    action={
                      known.data?.can.startRound && (
                        <LinkButton kind="primary" to={to('newRound', { panel })}>
                          Start an evening
                        </LinkButton>
                      )
                    }
                  />
                </div>
              )}
            </>
          )
        }}
      </Asked>
    </ListPage>
  )
}
