const formats = new Map<string, Intl.NumberFormat>()

function formatOf(currency: string): Intl.NumberFormat {
  const known = formats.get(currency)
  if (known) return known
  const made = new Intl.NumberFormat('en-GB', { style: 'currency', currency, currencyDisplay: 'code' })
  formats.set(currency, made)
  return made
}

export interface Price { minor: number, currency: string, on: string }

/**
 * A price such as `EUR 569.95`, whole amounts without decimals: `EUR 95`.
 *
 * @param minor in hundredths, negative allowed
 * @param currency three letters, ISO 4217
 */
export function moneyInWords(minor: number, currency: string): string {
  const text = formatOf(currency).format(minor / 100).replaceAll('\u00A0', ' ')
  return minor % 100 === 0 ? text.replace(/\.00$/, '') : text
}

/** A price with its day, or that none is stated. */
export const priceInWords = (price: Price | null): string => price === null ? 'no price stated' : moneyInWords(price.minor, price.currency)
