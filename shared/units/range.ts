/**
 * Returns the value when it lies in the closed interval; otherwise throws.
 *
 * @param name the quantity as the caller knows it, with its unit, such as `boat.lengthM`
 * @param value any number; NaN and the infinities are refused
 * @param min least allowed value
 * @param max greatest allowed value
 * @throws RangeError naming the quantity, the allowed interval and the value
 */
export function inRange(name: string, value: number, min: number, max: number): number {
  if (typeof value === 'number' && value >= min && value <= max && Number.isFinite(value)) return value
  throw new RangeError(`${name} must be between ${min} and ${max}, got ${String(value)}`)
}
