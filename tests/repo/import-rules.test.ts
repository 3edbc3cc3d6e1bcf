import { ESLint } from 'eslint'
import { describe, expect, it } from 'vitest'

const eslint = new ESLint({ cwd: process.cwd() })
const house = /^(house\/imports|no-restricted-(syntax|properties|globals))$/

/** What the house rules say about a line of code, were it in that file. */
async function complaints(file: string, code: string): Promise<string[]> {
  const [result] = await eslint.lintText(`${code}\n`, { filePath: file })
  const messages = result?.messages ?? []
  const fatal = messages.filter((message) => message.fatal)
  expect(fatal, 'the line must parse').toEqual([])
  return messages.filter(({ ruleId }) => ruleId && house.test(ruleId)).map(({ message }) => message)
}

const imports = (specifier: string) => `import * as it from '${specifier}'\nexport const used = it`

/** File, line of code, and what the line is said to break. */
const refused: [file: string, code: string, why: RegExp][] = [
  ['shared/stats/median.ts', imports('#shared/domain/scale.ts'), /shared\/stats imports itself/],
  ['shared/stats/median.ts', imports('../allocation/williams.ts'), /shared\/stats imports itself/],
  ['shared/stats/mixed/fit.ts', imports('../../acoustics/weighting.ts'), /shared\/stats imports itself/],
  ['shared/stats/median.ts', imports('zod'), /shared\/stats imports itself/],
  ['shared/stats/median.ts', imports('node:fs'), /shared\/stats imports itself/],
  ['shared/stats/median.ts', `export const load = () => import('zod')`, /shared\/stats imports itself/],
  ['shared/stats/median.ts', `export * from '#server/env.ts'`, /shared\/stats imports itself/],
  ['shared/stats/median.ts', `export type T = import('#src/lib/call.ts').T`, /shared\/stats imports itself/],
  ['shared/stats/median.ts', 'export const now = Date.now()', /Date/],
  ['shared/stats/median.ts', 'export const draw = Math.random()', /Randomness is an argument/],
  ['shared/allocation/codes.ts', imports('#shared/stats/median.ts'), /shared\/allocation imports itself/],
  ['shared/allocation/codes.ts', 'export const draw = crypto.getRandomValues', /crypto/],
  ['shared/acoustics/target.ts', imports('#shared/contracts/errors.ts'), /shared\/acoustics imports itself/],
  ['shared/domain/scale.ts', imports('#shared/contracts/errors.ts'), /shared\/domain imports itself/],
  ['shared/domain/scale.ts', imports('#server/env.ts'), /shared\/domain imports itself/],
  ['shared/domain/scale.ts', imports('node:crypto'), /shared\/domain imports itself/],
  ['shared/domain/scale.ts', 'export const now = new Date()', /Time is an argument/],
  ['shared/contracts/rounds.ts', imports('#server/models/round.ts'), /contracts import the domain/],
  ['shared/contracts/rounds.ts', imports('express'), /contracts import the domain/],
  ['server/models/round.ts', imports('#server/features/rounds/service.ts'), /models hold columns/],
  ['server/models/round.ts', imports('../http/api-error.ts'), /models hold columns/],
  ['server/policies/rounds.ts', imports('#server/models/round.ts'), /policies are pure/],
  ['server/policies/rounds.ts', imports('sequelize'), /policies are pure/],
  ['server/features/rounds/routes.ts', imports('#server/models/round.ts'), /routes know service/],
  ['server/features/rounds/routes.ts', imports('#server/db/transaction.ts'), /routes know service/],
  ['server/features/rounds/routes.ts', imports('#src/lib/call.ts'), /routes know service/],
  ['server/features/rounds/routes.ts', imports('sequelize'), /routes know service/],
  ['server/features/rounds/routes.ts', imports('#server/features/seats/presenter.ts'), /routes know service/],
  [
    'server/features/rounds/service.ts',
    imports('#server/features/seats/presenter.ts'),
    /another feature’s service/,
  ],
  ['server/features/rounds/service.ts', imports('../seats/draw.ts'), /another feature’s service/],
  [
    'server/features/rounds/service.ts',
    imports('#server/features/key/letters.ts'),
    /another feature’s service/,
  ],
  ['server/features/rounds/service.ts', imports('#src/lib/call.ts'), /another feature’s service/],
  ['server/features/rounds/service.ts', imports('express'), /another feature’s service/],
  ['server/features/rounds/presenter.ts', imports('#server/models/round.ts'), /a presenter turns/],
  ['server/features/rounds/presenter.ts', imports('./service.ts'), /a presenter turns/],
  ['server/features/rounds/presenter.ts', imports('#src/lib/call.ts'), /a presenter turns/],
  ['server/http/mount.ts', imports('#server/features/rounds/service.ts'), /what carries the features/],
  [
    'server/http/mount.ts',
    `import type { T } from '#src/lib/call.ts'\nexport type U = T`,
    /never import each other/,
  ],
  ['server/app.ts', imports('../src/main.tsx'), /never import each other/],
  ['server/app.ts', 'export const port = process.env.PORT', /only reader of process\.env/],
  ['server/features/key/service.ts', 'export const port = process.env.PORT', /only reader of process\.env/],
  ['server/features/seats/service.ts', imports('#server/models/key-entry.ts'), /key is read by/],
  [
    'server/features/seats/service.ts',
    `import { KeyLetter } from '#server/models/index.ts'\nexport { KeyLetter }`,
    /key is read by/,
  ],
  [
    'server/features/seats/service.ts',
    'export const read = (models) => models.RoundSecret',
    /key is read by/,
  ],
  ['server/features/seats/service.ts', "export const sql = 'select * from key_entries'", /key is read by/],
  ['server/jobs/close.ts', 'export const sql = `select * from round_secrets`', /key is read by/],
  ['server/http/mount.ts', "export const sql = 'set local role scrim_key'", /key is read by/],
  ['migrations/0009-more.ts', imports('#server/models/round.ts'), /migrations import nothing/],
  ['migrations/0009-more.ts', imports('#shared/domain/lexicon.ts'), /migrations import nothing/],
  ['seeders/evening.ts', imports('#src/lib/call.ts'), /seeders know/],
  ['src/main.tsx', imports('#server/env.ts'), /never import each other/],
  [
    'src/app/router.tsx',
    `import type { T } from '../../server/env.ts'\nexport type U = T`,
    /never import each other/,
  ],
  ['src/app/router.tsx', imports('node:path'), /never import each other/],
  ['src/lib/call.ts', imports('#src/features/rounds/queries.ts'), /components, hooks and lib/],
  ['src/components/Code.tsx', imports('#src/app/router.tsx'), /components, hooks and lib/],
  ['src/hooks/useScheme.ts', imports('#server/env.ts'), /components, hooks and lib/],
  ['src/features/rounds/queries.ts', imports('#src/features/seats/queries.ts'), /no other feature/],
  ['src/features/rounds/pages/Plan.tsx', imports('../../seats/queries.ts'), /no other feature/],
  [
    'src/features/rounds/queries.ts',
    imports('#server/features/rounds/service.ts'),
    /never import each other/,
  ],
  ['src/features/rounds/queries.ts', imports('#src/app/router.tsx'), /no other feature/],
]

const allowed: [file: string, code: string][] = [
  ['shared/stats/mixed/fit.ts', imports('../median.ts')],
  ['shared/stats/median.ts', imports('simple-statistics')],
  ['shared/allocation/codes.ts', imports('@noble/hashes/sha2.js')],
  ['shared/domain/verdict.ts', imports('#shared/stats/median.ts')],
  ['shared/contracts/rounds.ts', imports('#shared/domain/limits.ts')],
  ['shared/domain/dates.ts', 'export const read = (text: string) => new Date(text)'],
  ['shared/stats/median.test.ts', imports('vitest')],
  ['server/features/rounds/routes.ts', imports('./service.ts')],
  ['server/features/rounds/routes.ts', imports('#server/http/mount.ts')],
  ['server/features/rounds/service.ts', imports('#server/features/key/service.ts')],
  ['server/features/rounds/service.ts', imports('#server/models/round.ts')],
  ['server/features/rounds/presenter.ts', imports('#shared/contracts/rounds.ts')],
  [
    'server/features/key/service.ts',
    `import { KeyEntry } from '#server/models/index.ts'\nexport { KeyEntry }`,
  ],
  ['server/env.ts', 'export const port = process.env.PORT'],
  ['server/db/migrate.ts', imports('#migrations/index.ts')],
  ['src/features/rounds/pages/Plan.tsx', imports('../queries.ts')],
  ['src/features/rounds/pages/Plan.tsx', imports('#src/features/rounds/queries.ts')],
  ['src/features/rounds/pages/Plan.tsx', imports('#src/app/paths.ts')],
  ['src/app/router.tsx', imports('#src/features/rounds/pages/Plan.tsx')],
]

describe('the import rules', () => {
  it.each(refused)('refuse in %s: %s', async (file, code, why) => {
    const said = await complaints(file, code)
    expect(said.join('\n')).toMatch(why)
  })

  it.each(allowed)('allow in %s: %s', async (file, code) => {
    expect(await complaints(file, code)).toEqual([])
  })
})
