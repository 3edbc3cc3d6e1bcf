import * as contract from '#shared/contracts/seats.ts'
import { notFound } from '#server/http/api-error.ts'
import { mountEvents } from '#server/http/event-stream.ts'
import type { Feature } from '#server/http/feature.ts'
import { openLink } from './join-service.ts'
import { ownReport } from './report-service.ts'
import * as service from './service.ts'
import { submit } from './submit-service.ts'

export const seats: Feature = (mount, router, deps) => {
  mount(contract.join, async ({ params }, context) => ({ path: await openLink(context, params.token) }))
  mount(contract.getSeat, ({ params }, context) => service.showSeat(context, params.seat))
  mount(contract.giveConsent, ({ params, body }, context) =>
    service.consent(context, params.seat, body.version),
  )
  mount(contract.leaveSeat, ({ params }, context) => service.leave(context, params.seat))
  mount(contract.confirmCode, ({ params, body }, context) =>
    service.confirm(context, params.seat, params.serving, body.code),
  )
  mount(contract.checkSeal, ({ params, body }, context) =>
    service.noteSeal(context, params.seat, params.serving, body.sealed),
  )
  mount(contract.submitRatings, ({ params, body }, context) => submit(context, params, body))
  mount(contract.answerEnd, ({ params, body }, context) => service.answerEnd(context, params.seat, body))
  mount(contract.getSeatReport, ({ params }, context) => ownReport(context, params.seat))
  mount(contract.forgetSeat, async ({ params }, context) => {
    if (!context.actor.seatIds.includes(params.seat)) throw notFound()
    context.session.forgetSeat(params.seat)
    return { done: true as const }
  })
  mountEvents(router, deps, contract.seatEvents, (params, context) => service.hearSeat(context, params.seat))
}
