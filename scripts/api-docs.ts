/** Writes docs/api.md from the contracts. */
import { writeFileSync } from 'node:fs'
import { apiPage } from '#server/http/api-page.ts'
import { openApi } from '#server/http/openapi.ts'

writeFileSync('docs/api.md', apiPage(openApi()))
console.log('Wrote docs/api.md')
