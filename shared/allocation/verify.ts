import { canonicalJson } from './canonical-json.ts'
import { deal } from './deal.ts'
import { fingerprint, keyRows } from './key-files.ts'
import { readKey, readPlan, ShapeError } from './shapes.ts'
import type { Check, Json, KeyDocument, KeyRow, PlanDocument } from './types.ts'

const check = (name: string, ok: boolean, detail: string): Check => ({ name, ok, detail })

/** What a reader throws as a check that failed; any other error is a fault of ours and goes on. */
function attempt<T>(name: string, checks: Check[], read: () => T, detail: string): T | null {
  try {
    const value = read()
    checks.push(check(name, true, detail))
    return value
  } catch (error) {
    if (!(error instanceof ShapeError)) throw error
    checks.push(check(name, false, error.message))
    return null
  }
}

function hashed(what: string, text: string, published: string): Check {
  const own = fingerprint(text)
  const same = own === published
  return check(
    `The ${what} file has the published fingerprint`,
    same,
    same ? own : `${own}, published ${published}`,
  )
}

function designAgrees(key: KeyDocument, plan: PlanDocument, turns: number): Check {
  const { mode, listeners, spares, codePolicy } = key.draw
  const drawn = { mode, units: key.units.length, listeners, spares, turns, codePolicy }
  const same = canonicalJson(drawn) === canonicalJson(plan.plan.design)
  const said = `${drawn.units} units, ${listeners} listeners, ${spares} spare rows, ${turns} turns`
  return check(
    'The draw follows the frozen plan',
    same,
    same ? said : `the key says ${said}; the plan differs`,
  )
}

const servings = (rows: readonly KeyRow[]) =>
  rows.flatMap((row) =>
    row.places.map((place) => canonicalJson({ listener: row.listener, set: row.set, ...place })),
  )

function repeated(key: KeyDocument, plan: PlanDocument): Check[] {
  const name = 'The published seed gives the same draw'
  const unitIds = key.units.map((unit) => unit.id)
  const sorted = unitIds.every((id, i) => i === 0 || unitIds[i - 1]! < id)
  if (!sorted || unitIds.length < 2 || unitIds.length > 12) {
    return [check(name, false, 'the key does not name two to twelve units in order')]
  }
  const { listeners, spares, codePolicy, attempt: nth, excludedPairs, excludedCodes } = key.draw
  const dealt = deal({
    seed: key.seed,
    unitIds,
    listeners,
    spares,
    codePolicy,
    attempt: nth,
    excludedPairs,
    excludedCodes,
  })
  if (!dealt.ok) return [check(name, false, dealt.detail)]
  const published = servings(key.rows)
  const again = servings(keyRows({ rows: dealt.rows, codePolicy }))
  const same = again.filter((serving, i) => serving === published[i]).length
  const all = same === again.length && published.length === again.length
  const letters = canonicalJson(dealt.letters as Json) === canonicalJson((key.letters ?? []) as Json)
  const counted = `${same} of ${Math.max(again.length, published.length)} servings the same`
  return [
    check(name, all && letters, letters ? counted : `${counted}; the letters differ`),
    designAgrees(key, plan, dealt.turns),
  ]
}

/** Re-runs the draw from the published seed; every (position, turn, code, unit) must come out the same. */
export function repeatDraw(keyText: string, planText: string): Check[] {
  const checks: Check[] = []
  const plan = attempt('The plan file can be read', checks, () => readPlan(planText), 'scrim-plan-1')
  const key = attempt('The key file can be read', checks, () => readKey(keyText), 'scrim-key-1')
  return plan && key ? [...checks, ...repeated(key, plan)] : checks
}

function linked(key: KeyDocument, plan: PlanDocument): Check {
  const own = fingerprint(canonicalJson(plan.plan))
  const same = own === plan.planDigest && own === key.planDigest && plan.round === key.round
  return check('The key belongs to the plan', same, same ? own : 'the plan’s digest or the round differs')
}

/** A number above the rows stands for whoever took over the row of (number − rows). */
function codesInKey(key: KeyDocument): Set<string> {
  const rows = key.draw.listeners + key.draw.spares
  const found = new Set<string>()
  for (const row of key.rows) {
    const shared = row.set === 'reserve' || key.draw.codePolicy === 'split'
    for (const { code } of row.places) {
      found.add(`${row.listener} ${code}`)
      if (shared) found.add(`${row.listener + rows} ${code}`)
    }
  }
  return found
}

function ratingsCovered(key: KeyDocument, rated: readonly { listener: number; code: number }[]): Check {
  const known = codesInKey(key)
  const strange = rated.filter(({ listener, code }) => !known.has(`${listener} ${code}`))
  const first = strange[0]
  return check(
    'Every rating’s code is in the key',
    first === undefined,
    first
      ? `${strange.length} of ${rated.length} are not, first listener ${first.listener}, code ${first.code}`
      : `${rated.length} ratings`,
  )
}

/**
 * What a reader's browser checks: fingerprints of the bytes, both files' form, the link between them, the draw
 * repeated from the seed. `ratingsText` is null where the organiser publishes no rows. `ratedRows` is what the
 * ratings file holds, read by the caller: each listener number and code must be in the key.
 */
export function verifyFiles(input: {
  planText: string
  keyText: string
  ratingsText: string | null
  fingerprints: { plan: string; key: string; ratings: string | null }
  ratedRows?: readonly { listener: number; code: number }[]
}): Check[] {
  const { planText, keyText, ratingsText, fingerprints, ratedRows } = input
  const checks = [hashed('plan', planText, fingerprints.plan), hashed('key', keyText, fingerprints.key)]
  if (ratingsText !== null) checks.push(hashed('ratings', ratingsText, fingerprints.ratings ?? 'none'))
  const plan = attempt('The plan file can be read', checks, () => readPlan(planText), 'scrim-plan-1')
  const key = attempt('The key file can be read', checks, () => readKey(keyText), 'scrim-key-1')
  if (!plan || !key) return checks
  checks.push(linked(key, plan), ...repeated(key, plan))
  if (ratedRows) checks.push(ratingsCovered(key, ratedRows))
  return checks
}
