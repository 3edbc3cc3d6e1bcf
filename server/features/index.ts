import type { Feature } from '../http/feature.ts'
import { account } from './account/routes.ts'
import { analysis } from './analysis/routes.ts'
import { demo } from './demo/routes.ts'
import { imports } from './imports/routes.ts'
import { panels } from './panels/routes.ts'
import { rounds } from './rounds/routes.ts'
import { seats } from './seats/routes.ts'
import { table } from './table/routes.ts'
import { tags } from './tags/routes.ts'
import { verdicts } from './verdicts/routes.ts'

export const features: readonly Feature[] = [
  account,
  demo,
  panels,
  rounds,
  tags,
  table,
  seats,
  analysis,
  verdicts,
  imports,
]
