import * as z from 'zod/mini'
import { fieldsOf, saying } from './fields'

const versionWords = saying('the number of a release such as 2026 or 2026.1')
export const releaseVersion = z.string(versionWords).check(
  z.maxLength(20, versionWords), z.regex(/^\d+(?:\.\d+)*$/, versionWords), z.describe('Number of the release, such as 2026'),
)

const fileWords = saying('the name of a file such as pulls.csv')
const releaseFile = z.string(fileWords).check(
  z.maxLength(80, fileWords), z.regex(/^[a-z0-9]+(?:[._-][a-z0-9]+)*$/, fileWords), z.describe('Name of a file of the release, such as pulls.csv'),
)

/** GET /api/releases */
export const releasesQuery = fieldsOf({}, 'All releases')

/** GET /api/releases/{version} */
export const releaseParams = fieldsOf({ version: releaseVersion }, 'Which release')

/** GET /api/releases/{version}/{file} */
export const releaseFileParams = fieldsOf({ version: releaseVersion, file: releaseFile }, 'Which file of which release')

const momentWords = saying('a moment such as 2026-09-16T18:00:00Z')
const moment = z.string(momentWords).check(z.regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d(?:\.\d+)?Z$/, momentWords))

/** What the job that makes a release is told. */
export const releaseOrder = fieldsOf({ version: releaseVersion, cutAt: moment, notes: z.string().check(z.maxLength(2000)) }, 'A release to make')
export type ReleaseOrder = z.output<typeof releaseOrder>
