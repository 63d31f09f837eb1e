import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs'
import { join, relative } from 'node:path'
import { fileURLToPath } from 'node:url'

export const root = fileURLToPath(new URL('../..', import.meta.url))

export interface SourceFile { path: string, text: string }

const passedOver = new Set(['node_modules', '.nuxt', '.output', '.data', '.git'])

function under(folder: string): string[] {
  if (!existsSync(folder)) return []
  return readdirSync(folder).filter(name => !passedOver.has(name)).flatMap((name) => {
    const path = join(folder, name)
    return statSync(path).isDirectory() ? under(path) : [path]
  })
}

/** The files below these folders whose names end so, with their text. */
export function projectFiles(folders: string[], ending = /\.(ts|vue|mjs)$/): SourceFile[] {
  return folders.flatMap(folder => under(join(root, folder))).filter(path => ending.test(path))
    .map(path => ({ path: relative(root, path).replaceAll('\\', '/'), text: readFileSync(path, 'utf8') }))
}

/** The specifiers that a file imports, types and dynamic imports included. */
export function importsOf(text: string): string[] {
  const found = text.matchAll(/(?:\bfrom\s*|\bimport\s*\(\s*|^\s*import\s+)['"]([^'"]+)['"]/gm)
  return [...found].map(match => match[1] ?? '')
}
