/**
 * A logarithmic scale from a domain to 0 to 100 per cent, rounded to a hundredth; what lies outside stands at the ends.
 *
 * @param low least value of the domain, more than 0
 * @param high greatest, more than low
 */
export function logScale(low: number, high: number): (value: number) => number {
  const span = Math.log(high / low)
  return value => Math.round(Math.min(Math.max(Math.log(value / low) / span, 0), 1) * 1e4) / 100
}

const steps = [1, 2, 5]

/** Round values, 1, 2 and 5 times a power of ten, inside a domain; every other one where there would be more than `most`. */
export function roundValues(low: number, high: number, most = 7): number[] {
  const [first, last] = [Math.floor(Math.log10(low)), Math.ceil(Math.log10(high))]
  const values = Array.from({ length: last - first + 1 }, (_, index) => steps.map(step => Number(`${step}e${first + index}`))).flat()
    .filter(value => value >= low && value <= high)
  return values.length > most ? values.filter((_, index) => index % 2 === 0) : values
}
