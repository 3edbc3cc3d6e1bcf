/** How figures are written on screens: a true minus sign, as many decimals as the scale deserves, never NaN. */
const minus = '−'
const signed = (text: string): string => text.replace('-', minus)

/** Decimals for points of a scale: 1 for a range of 50 and more (0–100), 2 from 5, else 3. */
export function decimalsFor(scale: { low: number; high: number }): number {
  const range = scale.high - scale.low
  if (range >= 50) return 1
  return range >= 5 ? 2 : 3
}

/** A score, mean or median in points of its scale; a dash where there is none. */
export const asPoints = (value: number | null, scale: { low: number; high: number }): string =>
  value === null ? '–' : signed(value.toFixed(decimalsFor(scale)))

/** "between 13.0 and 29.0" in points of the scale. */
export const asRange = (low: number, high: number, scale: { low: number; high: number }): string =>
  `between ${asPoints(low, scale)} and ${asPoints(high, scale)}`

/** A coefficient of agreement (ICC, alpha, W) with two decimals. */
export const asShare = (value: number): string => signed(value.toFixed(2))

/** "0.78, between 0.61 and 0.88", or the estimate alone where no interval can be given. */
export const asShareWithInterval = (estimate: {
  estimate: number
  interval: { low: number; high: number } | null
}): string =>
  estimate.interval === null
    ? asShare(estimate.estimate)
    : `${asShare(estimate.estimate)}, between ${asShare(estimate.interval.low)} and ${asShare(estimate.interval.high)}`

/** A variance component or criterion: at least four decimals and at least four significant digits. */
export function asComponent(value: number): string {
  if (value === 0) return '0'
  const leading = Math.floor(Math.log10(Math.abs(value)))
  return signed(value.toFixed(Math.min(12, Math.max(4, 3 - leading))))
}

/** A p-value with three decimals; under .001 in words. */
export const asP = (p: number): string => (p < 0.001 ? 'below 0.001' : p.toFixed(3))

/** Degrees of freedom: whole where they are whole, else two decimals. */
export const asDf = (df: number): string =>
  Math.abs(df - Math.round(df)) < 1e-6 ? String(Math.round(df)) : df.toFixed(2)
