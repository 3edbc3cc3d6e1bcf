/** A number as the pages print it: the wished decimals, a real minus sign. */
export function printed(value: number, decimals = 0): string {
  const text = value.toFixed(decimals)
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', '−')
}

/** "61 to 73" */
export const printedRange = (low: number, high: number, decimals = 0) =>
  `${printed(low, decimals)} to ${printed(high, decimals)}`
