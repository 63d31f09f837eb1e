import { answerLoads } from '#shared/ranking/planLoad'
import type { LoadAnswer, LoadRequest } from '#shared/types/load'

/** What the boat asks of the anchor. @throws FieldError naming what the calculation refuses */
export function loads(request: LoadRequest): LoadAnswer {
  return answerLoads(request)
}
