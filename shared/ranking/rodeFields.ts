import { FieldError } from '#shared/utils/fieldError'

const parts = ['chain.', 'rope.', 'snubber.']

/**
 * Runs a calculation on a request's rode; a refused part of it is named as the request names it, `rode.chain.lengthM`.
 *
 * @throws whatever the calculation throws
 */
export function withRodeFields<T>(calculate: () => T): T {
  try {
    return calculate()
  }
  catch (error) {
    if (!(error instanceof FieldError) || !parts.some(part => error.field.startsWith(part))) throw error
    const message = error.message.startsWith(error.field) ? `rode.${error.message}` : error.message
    throw new FieldError(`rode.${error.field}`, message)
  }
}
