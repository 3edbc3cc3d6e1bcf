import * as contract from '#shared/contracts/rounds.ts'
import { mountEvents } from '#server/http/event-stream.ts'
import type { Feature } from '#server/http/feature.ts'
import { cancelledFile } from './cancelled-service.ts'
import { closeRound } from './close-service.ts'
import * as service from './service.ts'
import { viewPublicRound } from './view-service.ts'

export const rounds: Feature = (mount, router, deps) => {
  mount(contract.createEvening, ({ params, body }, context) =>
    service.createEvening(context, params.panel, body),
  )
  mount(contract.getRound, ({ params }, context) => service.showRound(context, params))
  mount(contract.changeEvening, ({ params, body }, context) => service.changeEvening(context, params, body))
  mount(contract.openRound, ({ params }, context) => service.openRound(context, params))
  mount(contract.cancelRound, ({ params, body }, context) =>
    service.cancelRound(context, params, body.reason),
  )
  mount(contract.closeRound, ({ params, body }, context) => closeRound(context, params, body))
  mount(contract.draftAgain, ({ params }, context) => service.draftAgain(context, params))
  mount(contract.getProgress, ({ params }, context) => service.showProgress(context, params))
  mount(contract.listHandovers, async ({ params }, context) => ({
    handovers: await service.showHandovers(context, params),
  }))
  mount(contract.renewLink, ({ params }, context) => service.renewLink(context, params))
  mountEvents(router, deps, contract.roundEvents, (params, context) => service.hearRound(context, params))
  mount(
    contract.getRoundFile,
    ({ params }, context) => cancelledFile(context, params.round, params.file) as never,
  )
  mount(contract.getPublicRound, ({ params }, context) => viewPublicRound(context, params.round))
}
