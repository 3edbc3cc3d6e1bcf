import type { Endpoint } from './endpoint.ts'
import * as account from './account.ts'
import * as analysis from './analysis.ts'
import * as imports from './imports.ts'
import * as panels from './panels.ts'
import * as rounds from './rounds.ts'
import * as seats from './seats.ts'
import * as table from './table.ts'
import * as tags from './tags.ts'
import * as verdicts from './verdicts.ts'

const isEndpoint = (value: unknown): value is Endpoint =>
  typeof value === 'object' && value !== null && 'method' in value && 'path' in value && 'audience' in value

/** Every endpoint that the contracts declare: for OpenAPI, the permission table and the blind's sweep. */
export const endpoints: readonly Endpoint[] = [
  account,
  panels,
  rounds,
  tags,
  table,
  seats,
  analysis,
  verdicts,
  imports,
]
  .flatMap((feature): unknown[] => Object.values(feature))
  .filter(isEndpoint)
