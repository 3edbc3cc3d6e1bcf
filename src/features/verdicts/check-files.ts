import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import type { Check } from '#shared/allocation/types.ts'

type Checked = Pick<PublicVerdict, 'files' | 'fingerprints'>

/** Fetches a file as text whose UTF-8 bytes are exactly the bytes that came. */
export async function fetchExactly(url: string): Promise<string> {
  const answer = await fetch(url)
  if (!answer.ok) throw new Error(`${url.split('/').pop() ?? url} could not be fetched (${answer.status}).`)
  return new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(await answer.arrayBuffer())
}

/** Which (listener, code) pairs a ratings file holds, each once. */
export async function ratedRowsOf(ratingsText: string): Promise<{ listener: number; code: number }[]> {
  const { parseRatingsFile } = await import('#shared/domain/ratings-file.ts')
  const pairs = new Map<string, { listener: number; code: number }>()
  for (const { panelist, code } of parseRatingsFile(ratingsText).rows)
    pairs.set(`${panelist} ${code}`, { listener: Number(panelist), code: Number(code ?? NaN) })
  return [...pairs.values()]
}

/** Ratings that nobody drew a key for: only their own fingerprint can be checked. */
async function checkRatingsAlone(ratingsText: string, wanted: string): Promise<Check[]> {
  const { fingerprint } = await import('#shared/allocation/key-files.ts')
  const found = fingerprint(ratingsText)
  return [
    {
      name: 'ratings.csv has the published fingerprint',
      ok: found === wanted,
      detail: found === wanted ? found : `found ${found}, published ${wanted}`,
    },
  ]
}

/**
 * Checks a verdict's files in this browser: the SHA-256 of each, that plan and key belong together, that every published
 * row stands in the key, and that the draw, repeated from the published seed, gives the same rows and codes.
 */
export async function checkVerdict(
  { files, fingerprints }: Checked,
  fetchText: (url: string) => Promise<string> = fetchExactly,
): Promise<Check[]> {
  const textOf = async (name: string): Promise<string | null> => {
    const file = files.find((one) => one.name === name)
    return file === undefined ? null : fetchText(file.url)
  }
  const [planText, keyText, ratingsText] = await Promise.all(
    ['plan.json', 'key.json', 'ratings.csv'].map(textOf),
  )
  if (planText && keyText && fingerprints.plan !== null && fingerprints.key !== null) {
    const { verifyFiles } = await import('#shared/allocation/verify.ts')
    return verifyFiles({
      planText,
      keyText,
      ratingsText: ratingsText ?? null,
      fingerprints: {
        plan: fingerprints.plan,
        key: fingerprints.key,
        ratings: ratingsText ? fingerprints.ratings : null,
      },
      ...(ratingsText ? { ratedRows: await ratedRowsOf(ratingsText) } : {}),
    })
  }
  return ratingsText && fingerprints.ratings !== null
    ? checkRatingsAlone(ratingsText, fingerprints.ratings)
    : []
}

/** One sentence over all checks. */
export function checkedWords(checks: readonly Check[]): string {
  const failed = checks.filter((check) => !check.ok).length
  if (checks.length === 0) return 'There is nothing that could be checked.'
  return failed === 0
    ? `All ${checks.length} checks passed, in this browser, from the files themselves.`
    : `${failed} of ${checks.length} checks failed.`
}
