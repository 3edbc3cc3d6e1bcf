import * as contract from '#shared/contracts/analysis.ts'
import type { Feature } from '#server/http/feature.ts'
import { showAgreement, showReveal } from './service.ts'

export const analysis: Feature = (mount) => {
  mount(contract.getAgreement, ({ params }, context) => showAgreement(context, params))
  mount(contract.getReveal, ({ params }, context) => showReveal(context, params))
}
