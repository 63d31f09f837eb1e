import { getRouterParams } from 'h3'
import { visitor } from '#shared/access/mayRead'
import { releaseFileParams } from '#shared/schemas/release'
import { releaseFile } from '../../../services/releaseFiles'
import { sendFile } from '../../../utils/download'
import { apiHandler } from '../../../utils/handler'
import { validate } from '../../../utils/validate'

/** A file of a release, to be saved. */
export default apiHandler(async (event) => {
  const { version, file } = validate(releaseFileParams, getRouterParams(event, { decode: true }))
  return sendFile(event, await releaseFile(visitor, version, file))
})
