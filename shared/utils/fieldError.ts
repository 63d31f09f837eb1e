/** A refused value, with the name of the field it came from, so that an answer can point at it. */
export class FieldError extends RangeError {
  /** where the value stands in the request, such as `chain.lengthM` */
  readonly field: string

  constructor(field: string, message: string) {
    super(message)
    this.name = 'FieldError'
    this.field = field
  }
}

/**
 * Refuses a number outside a closed interval, or not finite.
 *
 * @throws FieldError naming the field, the interval and the value
 */
export function mustBeWithin(field: string, value: number, low: number, high: number): void {
  if (!(value >= low && value <= high)) {
    throw new FieldError(field, `${field} must be from ${low} to ${high}, got ${value}`)
  }
}
