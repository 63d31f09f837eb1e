import { FieldError } from '#shared/utils/fieldError'

/**
 * Runs a calculation on a plan that is one part of a request; a refused field of it is named as the request names it,
 * `plan.rode.chain.lengthM`.
 *
 * @throws whatever the calculation throws
 */
export function withPlanFields<T>(calculate: () => T): T {
  try {
    return calculate()
  }
  catch (error) {
    if (!(error instanceof FieldError)) throw error
    const message = error.message.startsWith(error.field) ? `plan.${error.message}` : error.message
    throw new FieldError(`plan.${error.field}`, message)
  }
}
