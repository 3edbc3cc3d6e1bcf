/** A price in its own currency: `money(18900, 'EUR')` is "€189.00"; the minor unit is the currency's own. */
export function money(minor: number, currency: string): string {
  try {
    const format = new Intl.NumberFormat('en-GB', { style: 'currency', currency })
    const digits = format.resolvedOptions().maximumFractionDigits ?? 2
    return format.format(minor / 10 ** digits)
  } catch {
    return `${currency} ${(minor / 100).toFixed(2)}`
  }
}
