import * as contract from '#shared/contracts/table.ts'
import type { Feature } from '#server/http/feature.ts'
import { addListener } from './latecomer-service.ts'
import { reportIncident, setLeft, showTable } from './service.ts'
import { nextTurn, voidServing } from './turn-service.ts'

export const table: Feature = (mount) => {
  mount(contract.getTable, ({ params }, context) => showTable(context, params))
  mount(contract.nextTurn, ({ params, body }, context) => nextTurn(context, params, body.from))
  mount(contract.voidServing, ({ params, body }, context) => voidServing(context, params, body))
  mount(contract.seatLeaves, ({ params, body }, context) => setLeft(context, params, body.seat, true))
  mount(contract.seatReturns, ({ params, body }, context) => setLeft(context, params, body.seat, false))
  mount(contract.addListener, ({ params, body }, context) => addListener(context, params, body))
  mount(contract.reportIncident, async ({ params, body }, context) => {
    await reportIncident(context, params, body)
    return { done: true as const }
  })
}
