import { existsSync } from 'node:fs'
import { dirname, join, normalize } from 'node:path'
import { describe, expect, it } from 'vitest'
import { importRules } from './rules.mjs'
import { importsOf, projectFiles, root } from './sources'

interface Rule { of: string, may?: string[], never?: string[], packages: string[], remedy: string }
const rules = importRules as Rule[]

const inside = (path: string, folder: string) => path === folder || path.startsWith(`${folder}/`)

/** The path inside the project that a specifier means, or null for a package. */
function target(from: string, specifier: string): string | null {
  if (specifier.startsWith('#shared/')) return specifier.slice(1)
  if (specifier.startsWith('~~/')) return specifier.slice(3)
  if (specifier.startsWith('~/') || specifier.startsWith('@/')) return join('app', specifier.slice(2))
  if (specifier.startsWith('.')) return normalize(join(dirname(from), specifier))
  return null
}

function matchesPackage(specifier: string, name: string) {
  if (name.endsWith('*')) return specifier.startsWith(name.slice(0, -1))
  return specifier === name || specifier.startsWith(`${name}/`)
}

function offence(rule: Rule, from: string, specifier: string): boolean {
  const to = target(from, specifier)
  if (to === null) return rule.packages.some(name => matchesPackage(specifier, name))
  if (rule.may) return !rule.may.some(folder => inside(to, folder))
  return (rule.never ?? []).some(folder => inside(to, folder))
}

/** Every import that breaks a rule, as a line with offender, rule and remedy. */
export function offences(files: { path: string, text: string }[]): string[] {
  return files.flatMap(({ path, text }) => rules.filter(rule => inside(path, rule.of)).flatMap(rule =>
    importsOf(text).filter(specifier => offence(rule, path, specifier))
      .map(specifier => `${path} imports ${specifier}: not allowed in ${rule.of}. Remedy: ${rule.remedy}`)))
}

describe('imports', () => {
  it('follow the table of who may import whom', () => {
    expect(offences(projectFiles(['app', 'server', 'shared']))).toEqual([])
  })

  it('are caught when they break it', () => {
    const planted = [
      { path: 'shared/rode/x.ts', text: 'import { a } from \'#shared/load/survey\'' },
      { path: 'shared/stats/x.ts', text: 'import { a } from \'../holding/fit\'' },
      { path: 'server/api/x.post.ts', text: 'import { eq } from \'drizzle-orm\'' },
      { path: 'server/services/x.ts', text: 'import type { H3Event } from \'h3\'' },
      { path: 'app/components/base/X.vue', text: '<script setup lang="ts">\nimport { a } from \'#shared/load/survey\'\n</script>' },
      { path: 'shared/load/x.ts', text: 'const fs = await import(\'node:fs\')' },
    ]
    const found = offences(planted)
    for (const { path } of planted) expect(found.some(line => line.startsWith(path)), path).toBe(true)
  })

  it('inside the project lead to files that exist', () => {
    const lost = projectFiles(['app', 'server', 'shared']).flatMap(({ path, text }) => importsOf(text).flatMap((specifier) => {
      const to = target(path, specifier)
      if (to === null) return []
      const file = join(root, to)
      return [file, `${file}.ts`, `${file}.vue`, join(file, 'index.ts')].some(existsSync) ? [] : [`${path} -> ${specifier}`]
    }))
    expect(lost).toEqual([])
  })

  it('come in a graph of shared/ folders without a cycle', () => {
    const edges = new Map<string, Set<string>>()
    for (const { path, text } of projectFiles(['shared'])) {
      const from = path.split('/').slice(0, 2).join('/')
      for (const specifier of importsOf(text)) {
        const to = target(path, specifier)?.split('/').slice(0, 2).join('/')
        if (to && to !== from) edges.set(from, (edges.get(from) ?? new Set()).add(to))
      }
    }
    const reaches = (from: string, goal: string, seen = new Set<string>()): boolean =>
      [...edges.get(from) ?? []].some(next => next === goal || (!seen.has(next) && reaches(next, goal, seen.add(next))))
    expect([...edges.keys()].filter(folder => reaches(folder, folder))).toEqual([])
  })
})
