import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { StewardTable } from '#shared/contracts/table.ts'
import { tableQuery, type AtTable } from './queries.ts'

/** One act of the steward; every act answers with the table as it stands then. */
export function useTableAct<Input>(
  at: AtTable,
  act: (input: Input) => Promise<StewardTable>,
  done?: (table: StewardTable) => void,
) {
  const client = useQueryClient()
  const { queryKey } = tableQuery(at)
  return useMutation({
    mutationFn: act,
    onSuccess: async (table) => {
      await client.cancelQueries({ queryKey })
      client.setQueryData(queryKey, table)
      done?.(table)
    },
    // A stale version: the table has moved on meanwhile, so show it as it is.
    onError: () => void client.invalidateQueries({ queryKey }),
  })
}
