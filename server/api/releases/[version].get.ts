import { getRouterParams } from 'h3'
import { visitor } from '#shared/access/mayRead'
import { releaseParams } from '#shared/schemas/release'
import { release } from '../../services/releases'
import { apiHandler } from '../../utils/handler'
import { validate } from '../../utils/validate'

/** One release with its files and what changed. */
export default apiHandler(event => release(visitor, validate(releaseParams, getRouterParams(event, { decode: true })).version))
