import { mustBeWithin } from '#shared/utils/fieldError'

/**
 * Returns the value when it is finite and lies in the closed interval.
 *
 * @param field where the value stands in a request, such as `boat.lengthM`
 * @throws FieldError (a RangeError) naming the field, the interval and the value
 */
export function within(field: string, value: number, low: number, high: number): number {
  mustBeWithin(field, value, low, high)
  return value
}
