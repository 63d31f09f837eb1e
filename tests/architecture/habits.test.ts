import { readFileSync, readdirSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { projectFiles, root } from './sources'

const product = projectFiles(['app', 'server', 'shared'], /\.(ts|vue)$/)
const lines = (text: string) => text.split('\n').length

function quantile(values: number[], share: number) {
  const sorted = [...values].sort((a, b) => a - b)
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? 0
}

describe('a file is one that a person can hold', () => {
  it('has at most 300 lines, tests and seed too', () => {
    const long = projectFiles(['app', 'server', 'shared', 'tests', 'seed'], /\.(ts|vue|mjs)$/).filter(file => lines(file.text) > 301)
    expect(long.map(file => `${file.path}: ${lines(file.text)}`)).toEqual([])
  })

  it('has under 80 lines in the median and under 200 at the 95th percentile', () => {
    const counts = product.map(file => lines(file.text))
    expect(quantile(counts, 0.5)).toBeLessThan(80)
    expect(quantile(counts, 0.95)).toBeLessThan(200)
  })

  it('that handles a request has at most 60 lines, 20 in the median', () => {
    const counts = projectFiles(['server/api']).map(file => lines(file.text))
    expect(Math.max(...counts)).toBeLessThanOrEqual(60)
    expect(quantile(counts, 0.5)).toBeLessThanOrEqual(20)
  })
})

describe('the tree', () => {
  it('has the agreed entries at its top and nothing else', () => {
    const agreed = new Set([
      'app', 'server', 'shared', 'tests', 'drizzle', 'seed', 'public', '.ci', '.git', '.gitignore', '.npmrc', 'node_modules', '.nuxt', '.output', '.data',
      'nuxt.config.ts', 'drizzle.config.ts', 'tailwind.config.ts', 'vitest.config.ts', 'eslint.config.mjs', 'tsconfig.json',
      'package.json', 'package-lock.json', 'README.md', 'DEVELOPERS.md', 'LICENSE',
    ])
    expect(readdirSync(root).filter(name => !agreed.has(name))).toEqual([])
  })

  it('has a lock file that records no download address', () => {
    const lock = readFileSync(join(root, 'package-lock.json'), 'utf8')
    expect(lock).not.toContain('"resolved": "http')
    expect(lock).not.toMatch(/https?:\/\/registry\./)
  })

  it('pins every package exactly', () => {
    const { dependencies, devDependencies } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')) as Record<string, Record<string, string>>
    const loose = Object.entries({ ...dependencies, ...devDependencies }).filter(([, version]) => !/^\d+\.\d+\.\d+$/.test(version))
    expect(loose).toEqual([])
  })

  it('has a README whose first paragraph states the job', () => {
    const [, first = ''] = readFileSync(join(root, 'README.md'), 'utf8').split(/\n\s*\n/)
    for (const word of ['anchor', 'boat', 'seabed', 'wind']) expect(first).toContain(word)
  })
})
