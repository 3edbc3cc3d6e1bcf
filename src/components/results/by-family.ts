import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import { families } from '#shared/domain/lexicon.ts'
import type { Family } from '#shared/domain/lexicon.ts'

/** Results under their families: liking first, then tonal balance, staging, timbre; each in the scorecard's order. */
export const byFamily = (
  results: readonly DescriptorResult[],
): { family: Family; results: DescriptorResult[] }[] =>
  families
    .map((family) => ({ family, results: results.filter((result) => result.descriptor.family === family) }))
    .filter((group) => group.results.length > 0)

/** Where a unit stands: its adjusted mean, else its mean, else its median; null without any score. */
export const standing = (unit: DescriptorResult['units'][number]): number | null =>
  unit.adjusted?.mean ?? unit.mean ?? unit.median

/** Units from the highest to the lowest; those without a score last, ties by name. */
export const fromTheTop = (units: DescriptorResult['units']): DescriptorResult['units'] =>
  [...units].sort((one, other) => {
    const difference = (standing(other) ?? -Infinity) - (standing(one) ?? -Infinity)
    return Number.isNaN(difference) || difference === 0 ? one.unit.localeCompare(other.unit) : difference
  })
