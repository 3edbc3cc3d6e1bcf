import * as contract from '#shared/contracts/imports.ts'
import type { Feature } from '#server/http/feature.ts'
import { previewImport, storeImport } from './service.ts'

export const imports: Feature = (mount) => {
  mount(contract.previewImport, ({ params, body }, context) =>
    previewImport(context, params.panel, body.text),
  )
  mount(contract.storeImport, async ({ params, body }, context) => ({
    round: await storeImport(context, params.panel, body),
  }))
}
