import * as contract from '#shared/contracts/verdicts.ts'
import type { Feature } from '#server/http/feature.ts'
import { listVerdicts, photoFile, showVerdict, verdictFile } from './public-service.ts'
import * as service from './service.ts'

export const verdicts: Feature = (mount) => {
  mount(contract.getVerdictDraft, ({ params }, context) => service.showDesk(context, params))
  mount(contract.saveVerdict, ({ params, body }, context) => service.saveWords(context, params, body))
  mount(contract.saveUnitFacts, ({ params, body }, context) => service.saveFacts(context, params, body))
  mount(contract.putPhoto, ({ params }, context) => service.savePhoto(context, params))
  mount(contract.removePhoto, ({ params }, context) => service.removePhoto(context, params))
  mount(contract.publishVerdict, ({ params, body }, context) =>
    service.publish(context, params, body.correction),
  )
  mount(contract.listVerdicts, async (_input, context) => ({ verdicts: await listVerdicts(context) }))
  mount(contract.getVerdict, ({ params, query }) => showVerdict(params.slug, query.version))
  mount(
    contract.getVerdictFile,
    ({ params }, context) => verdictFile(context, params.slug, params.file) as never,
  )
  mount(contract.getPhoto, ({ params }, context) => photoFile(context, params.photo) as never)
}
