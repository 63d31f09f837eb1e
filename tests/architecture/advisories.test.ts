// The pinned Nuxt has published advisories that are avoided by rule (register in DEVELOPERS.md): each rule is held here.
import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { projectFiles, root, type SourceFile } from './sources'

const app = projectFiles(['app'])
const server = projectFiles(['server'])
const configuration = readFileSync(join(root, 'nuxt.config.ts'), 'utf8')

/** A path that begins with a literal folder of ours (what follows in it cannot make it another site's), or one that was passed. */
const path = '(?:[\'"`]/[a-z]|[\'"]/[\'"]|safePath\\()'

const found = (files: SourceFile[], pattern: RegExp) => files.filter(file => pattern.test(file.text)).map(file => file.path)

describe('what a person typed never becomes an address', () => {
  it('navigateTo takes a literal path or one that safePath() has passed', () => {
    expect(found(app, new RegExp(`navigateTo\\((?!\\s*(${path}|\\{ path: ${path}))`))).toEqual([])
  })

  it('reloadNuxtApp and <NoScript> are not used', () => {
    expect(found(app, /reloadNuxtApp\(|<NoScript/)).toEqual([])
  })

  it('<NuxtLink> takes a literal path or one that safePath() has passed', () => {
    expect(found(app, new RegExp(`<NuxtLink[^>]*\\s(?::to|v-bind:to)=(?!"(${path}|\\{ path: ${path}))`))).toEqual([])
    expect(found(app, /<NuxtLink[^>]*\sto="(?!\/(?![/\\]))/)).toEqual([])
  })
})

describe('what the framework could share between people is off', () => {
  it('no server islands', () => {
    expect(app.filter(file => /\.server\.vue$/.test(file.path) || file.path.includes('components/islands/'))).toEqual([])
    expect(found(app, /<NuxtIsland/)).toEqual([])
    expect(configuration).toMatch(/componentIslands: false/)
  })

  it('no shared cache of rendered pages or answers', () => {
    expect(configuration).not.toMatch(/\b(swr|isr)\b|cache:/)
    expect(found(server, /cachedEventHandler|defineCachedEventHandler|cachedFunction|defineCachedFunction/)).toEqual([])
  })

  it('no authorisation by route rules or page middleware', () => {
    expect(configuration).not.toMatch(/routeRules/)
    expect(found(projectFiles(['app/middleware']), /requireUserSession|useUserSession|loggedIn/)).toEqual([])
  })

  it('no templates compiled at run time', () => {
    expect(configuration).toMatch(/runtimeCompiler: false/)
    expect(found(app, /v-html|innerHTML/)).toEqual([])
  })

  it('the sealed session is read from its cookie alone', () => {
    expect(configuration).toMatch(/sessionHeader: false/)
  })
})
