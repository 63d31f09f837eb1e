import { messageFor, wordForField } from '~/utils/plan/answer'
import { labelOf } from '~/utils/plan/labels'

/** What was asked of the API, or why there is no answer, in words for the reader. */
export type Asked<T> = { answer: T, problem: null, missing: false } | { answer: null, problem: string, missing: boolean }

interface Refusal { statusCode?: number, data?: { statusCode?: number, message?: string, fields?: Record<string, string> } }

/** The first refused field as the reader knows it: by the plan's own word for it. */
function refusedField(fields: Record<string, string> = {}): string {
  const [first] = Object.entries(fields)
  if (!first) return 'something in the address is out of range.'
  const [field, message] = [first[0].replace(/^plan\./, ''), first[1]]
  const label = field.startsWith('anchors') ? 'An anchor' : labelOf(wordForField(field))
  return `${label}: ${messageFor(field, message)}`
}

/** What a refusal means to the reader; `missing` where there is no such thing. */
export function refusalInWords(error: unknown): { problem: string, missing: boolean } {
  const { statusCode, data } = error as Refusal
  const status = data?.statusCode ?? statusCode
  if (status === 404) return { problem: 'There is nothing of that name.', missing: true }
  if (status === 422) return { problem: `This cannot be worked out. ${refusedField(data?.fields)}`, missing: false }
  if (status === 503) return { problem: 'No estimates have been worked out from the pulls yet. Try again in a minute.', missing: false }
  if (status === 429) return { problem: 'Too much was asked for from your address in a short time. Try again in a minute.', missing: false }
  return { problem: 'The figures could not be fetched just now. Try again in a minute.', missing: false }
}

/** Asks, and turns a refusal into words. */
export async function asked<T>(ask: () => Promise<T>): Promise<Asked<T>> {
  try {
    return { answer: await ask(), problem: null, missing: false }
  }
  catch (error) {
    return { answer: null, ...refusalInWords(error) }
  }
}
