/** Prices are kept in minor units; how many a currency has is the platform's own knowledge (ISO 4217). */
function minorDigits(currency: string): number | null {
  if (!/^[A-Z]{3}$/.test(currency)) return null
  return (
    new Intl.NumberFormat('en-GB', { style: 'currency', currency }).resolvedOptions().maximumFractionDigits ??
    2
  )
}

/** "€189", "US$54.50", "JP¥29,800". */
export function asMoney(price: { minor: number; currency: string }): string {
  const digits = minorDigits(price.currency) ?? 2
  return new Intl.NumberFormat('en-GB', {
    style: 'currency',
    currency: price.currency,
    trailingZeroDisplay: 'stripIfInteger',
  }).format(price.minor / 10 ** digits)
}

/**
 * What a person typed as a price, in minor units: "189", "189.5", "1.234,50", "1 234,50". A mark followed by exactly
 * three digits groups thousands; the last mark followed by fewer is the decimal mark. Null where it cannot be read or
 * has more decimals than the currency.
 */
export function minorUnits(typed: string, currency: string): number | null {
  const digits = minorDigits(currency)
  if (digits === null) return null
  const text = typed.replace(/[\s\u00a0\u202f']/g, '')
  const parts = /^(\d{1,3}(?:[.,]?\d{3})*|\d+)(?:[.,](\d{1,2}))?$/.exec(text)
  if (!parts) return null
  const fraction = parts[2] ?? ''
  if (fraction.length > digits) return null
  return (
    Number((parts[1] ?? '').replace(/[.,]/g, '')) * 10 ** digits + Number(fraction.padEnd(digits, '0') || '0')
  )
}

/** Minor units as they are typed: "189", "189.50". */
export function typedMoney(price: { minor: number; currency: string }): string {
  const digits = minorDigits(price.currency) ?? 2
  const amount = price.minor / 10 ** digits
  return Number.isInteger(amount) ? String(amount) : amount.toFixed(digits)
}
