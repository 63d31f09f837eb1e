// What was done for which sources, so that a second run is quick.
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs'
import { dirname, join, relative } from 'node:path'

/** Remembered marks in one small JSON file; a lost or broken file only means that work is done again. */
export function openStamps(file) {
  let marks = {}
  try {
    marks = JSON.parse(readFileSync(file, 'utf8'))
  }
  catch { /* first run */ }
  return {
    get: name => marks[name],
    set(name, value) {
      marks[name] = value
      mkdirSync(dirname(file), { recursive: true })
      writeFileSync(file, JSON.stringify(marks, null, 2))
    },
  }
}

function filesUnder(path) {
  if (!existsSync(path)) return []
  if (statSync(path).isFile()) return [path]
  return readdirSync(path).filter(name => name !== 'node_modules' && !name.startsWith('.'))
    .flatMap(name => filesUnder(join(path, name)))
}

/** SHA-256 over the names and contents of the files at or under these paths. */
export function sourceHash(root, paths) {
  const hash = createHash('sha256')
  for (const file of paths.flatMap(path => filesUnder(join(root, path))).sort()) {
    hash.update(relative(root, file)).update('\0').update(readFileSync(file)).update('\0')
  }
  return hash.digest('hex')
}

export const buildSources = [
  'app', 'server', 'shared', 'drizzle', 'public', 'nuxt.config.ts', 'tailwind.config.ts', 'package-lock.json', 'tsconfig.json',
]
/** What decides the rows of the demo world, and the form of its releases. */
export const seedSources = [
  'seed/world', 'seed/seed.ts', 'seed/write.ts', 'drizzle', 'server/db/schema', 'shared/types/words.ts', 'shared/seabed', 'shared/rode', 'shared/units',
  'server/services/release', 'shared/utils/csv.ts',
]
