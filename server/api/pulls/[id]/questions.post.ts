import { getRouterParam, setResponseStatus } from 'h3'
import { pullParams, questionRequest } from '#shared/schemas/reading'
import { askAboutPull } from '../../../services/trialPages'
import { readRequest } from '../../../utils/body'
import { apiHandler } from '../../../utils/handler'
import { countQuestion } from '../../../utils/limits'
import { validate } from '../../../utils/validate'

/** Something wrong with this pull? Kept for the reviewers. */
export default apiHandler(async (event) => {
  const { id } = validate(pullParams, { id: getRouterParam(event, 'id') })
  const asked = await readRequest(event, questionRequest, { bytes: 16_000 })
  countQuestion(event)
  const kept = await askAboutPull(id, asked)
  setResponseStatus(event, 201)
  return kept
})
