import { createHash } from 'node:crypto'
import { parseRatingsFile, type FileRating } from '#shared/domain/ratings-file.ts'
import { analyse, STATISTICS_VERSION } from '#shared/stats/analyse.ts'
import type { Analysis } from '#shared/stats/analysis-types.ts'
import type { Context } from '#server/http/context.ts'
import { Analysis as StoredAnalysis } from '#server/models/analysis.ts'
import type { Round } from '#server/models/round.ts'

export interface Exclusion {
  listener: string
  rule: string
  reason: string
  excluded: boolean
}

export interface Analysed {
  rows: readonly FileRating[]
  /** By the frozen rules; this is the result that is published. */
  analysis: Analysis
  /** With everybody, where somebody was excluded (B8). */
  withAll: Analysis | null
  exclusions: Exclusion[]
  digest: string
  seed: string
  library: string
  at: Date
}

/** The frozen rule of an evening: who rated fewer than half of the units is left out. */
function exclusionsOf(rows: readonly FileRating[], units: number): Exclusion[] {
  const rated = new Map<string, Set<string>>()
  for (const row of rows) {
    const set = rated.get(row.panelist) ?? new Set()
    if (row.score !== null || row.cantTell) set.add(row.unit)
    rated.set(row.panelist, set)
  }
  return [...rated]
    .filter(([, heard]) => heard.size * 2 < units)
    .map(([listener, heard]) => ({
      listener,
      rule: 'fewer than half the servings',
      reason: `Rated ${heard.size} of ${units} units.`,
      excluded: true,
    }))
}

/** The round's analysis, computed from its fixed ratings file and stored with the digest of what it was computed from. */
export async function analysed(context: Context, round: Round, unitCount: number): Promise<Analysed> {
  if (!round.ratingsFile) throw new Error('A round is analysed after its ratings file was fixed.')
  const { rows } = parseRatingsFile(round.ratingsFile)
  const exclusions = round.origin === 'live' ? exclusionsOf(rows, unitCount) : []
  const out = new Set(exclusions.map((one) => one.listener))
  const seed = `scrim ${round.id}`
  const main = await stored(
    context,
    round,
    rows.filter((row) => !out.has(row.panelist)),
    seed,
    [...out],
  )
  const all = out.size === 0 ? null : await stored(context, round, rows, seed, [])
  return {
    rows,
    analysis: main.analysis,
    withAll: all?.analysis ?? null,
    exclusions,
    digest: main.digest,
    seed,
    library: STATISTICS_VERSION,
    at: main.at,
  }
}

async function stored(
  context: Context,
  round: Round,
  rows: readonly FileRating[],
  seed: string,
  out: readonly string[],
): Promise<{ analysis: Analysis; digest: string; at: Date }> {
  const what = JSON.stringify([round.ratingsFingerprint, [...out].sort(), seed])
  const digest = createHash('sha256').update(what).digest('hex')
  const before = await StoredAnalysis.findOne({
    where: { roundId: round.id, digest, libraryVersion: STATISTICS_VERSION },
  })
  if (before) return { analysis: before.result as Analysis, digest, at: before.createdAt }
  const analysis = analyse(rows, { seed })
  await StoredAnalysis.create({
    panelId: round.panelId,
    id: context.deps.random.id(),
    roundId: round.id,
    digest,
    libraryVersion: STATISTICS_VERSION,
    seed,
    result: analysis,
    createdAt: context.now,
  })
  return { analysis, digest, at: context.now }
}
