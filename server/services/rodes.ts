import { answerRode } from '#shared/rode/answer'
import type { RodeAnswer, RodeRequest } from '#shared/types/rode'

/** How the rode passes a load to the shank. @throws FieldError naming what the calculation refuses */
export function rodes(request: RodeRequest): RodeAnswer {
  return answerRode(request)
}
