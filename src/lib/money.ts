/** A price in its own currency: `money(18900, 'EUR')` is "€189", 18950 "€189.50"; the minor unit is the currency's own. */
export function money(minor: number, currency: string): string {
  try {
    const format = new Intl.NumberFormat('en-GB', {
      style: 'currency',
      currency,
      trailingZeroDisplay: 'stripIfInteger',
    })
    const digits = new Intl.NumberFormat('en-GB', { style: 'currency', currency }).resolvedOptions()
    return format.format(minor / 10 ** (digits.maximumFractionDigits ?? 2))
  } catch {
    return `${currency} ${(minor / 100).toFixed(2)}`
  }
}
