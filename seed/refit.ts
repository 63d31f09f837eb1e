// `npm run refit -- <folder>` or `npm run refit -- <address of a server> <version>`: fits a downloaded release again and compares the
// result with the estimates that it publishes. Fails where any figure differs by more than 1e-9.
import { fitHolding } from '../shared/holding/fitHolding'
import { compare, distance } from './refit/compare'
import { download, pullsOf, sourceOf } from './refit/read'

const tolerance = 1e-9

async function refit(place: string, version?: string): Promise<boolean> {
  const release = await download(sourceOf(place, version))
  const { descriptor, hash } = release
  const pulls = pullsOf(release)
  console.log(`${descriptor.title}\nSHA-256 of datapackage.json: ${hash}\n${pulls.length} pulls that stand; every file is the one described`)
  const fit = fitHolding(pulls)
  if (fit.modelVersion !== descriptor.fit.modelVersion) {
    console.log(`published with ${descriptor.fit.modelVersion}, this program fits ${fit.modelVersion}: the figures will differ`)
  }
  if (fit.dataHash !== descriptor.fit.dataHash) console.log(`the pulls hash to ${fit.dataHash}, published was ${descriptor.fit.dataHash}`)
  const figures = compare(release, fit)
  const worst = figures.reduce((far, next) => distance(next) > distance(far) ? next : far)
  const greatest = distance(worst)
  console.log(`${figures.length} figures compared; greatest difference ${greatest} (${worst.what}: published ${worst.published}, refitted ${worst.refitted})`)
  const agrees = greatest <= tolerance && fit.dataHash === descriptor.fit.dataHash
  console.log(agrees ? `the published estimates are reproduced within ${tolerance}` : `the published estimates are NOT reproduced within ${tolerance}`)
  return agrees
}

const [place, version] = process.argv.slice(2)
if (!place) {
  console.error('give the folder of a downloaded release, or the address of a server and a version: npm run refit -- http://localhost:3000 2026')
  process.exit(2)
}
try {
  process.exitCode = await refit(place, version) ? 0 : 1
}
catch (error) {
  console.error((error as Error).message)
  process.exitCode = 1
}
