import { describe, expect, it } from 'vitest'
import { ConfigurationError, readConfiguration } from '../../../server/utils/configuration'

const secret = 'q7VnX2mLr9TzB4cKd8WsJ1hYf6GuPe3A'
const production = {
  DATABASE_URL: 'postgres://app:pw@db.internal:5432/kedgewise', NUXT_SESSION_PASSWORD: secret, APP_ORIGIN: 'https://anchors.example',
}
const demo = {
  KEDGEWISE_DEMO: '1', HOST: '127.0.0.1', DATABASE_URL: 'postgres://app:pw@127.0.0.1:5432/kedgewise', NUXT_SESSION_PASSWORD: secret, APP_ORIGIN: 'http://localhost:3000',
}

function problems(env: Record<string, string | undefined>): string[] {
  try {
    readConfiguration(env)
    return []
  }
  catch (error) {
    if (error instanceof ConfigurationError) return error.problems
    throw error
  }
}

describe('readConfiguration', () => {
  it('accepts a whole production environment and a whole demo environment', () => {
    expect(readConfiguration(production)).toMatchObject({ demo: false, appOrigin: 'https://anchors.example' })
    expect(readConfiguration(demo)).toMatchObject({ demo: true })
  })

  it.each(['DATABASE_URL', 'NUXT_SESSION_PASSWORD', 'APP_ORIGIN'])('names %s when it is missing', (name) => {
    const found = problems({ ...production, [name]: undefined })
    expect(found).toHaveLength(1)
    expect(found[0]).toContain(name)
  })

  it('names everything that is missing at once', () => {
    expect(problems({})).toHaveLength(3)
  })

  it.each([
    ['too short', 'abc'], ['repeated', 'ab'.repeat(20)], ['a placeholder', 'please-change-this-password-now-0123'],
  ])('refuses a session secret that is %s', (_what, weak) => {
    expect(problems({ ...production, NUXT_SESSION_PASSWORD: weak })[0]).toContain('NUXT_SESSION_PASSWORD')
  })

  it('refuses an origin without TLS in production, or with a path', () => {
    expect(problems({ ...production, APP_ORIGIN: 'http://anchors.example' })[0]).toContain('APP_ORIGIN')
    expect(problems({ ...production, APP_ORIGIN: 'https://anchors.example/' })[0]).toContain('APP_ORIGIN')
  })

  it.each([
    ['HOST', { HOST: '0.0.0.0' }],
    ['HOST', { HOST: undefined }],
    ['HOST', { NITRO_HOST: '0.0.0.0' }],
    ['DATABASE_URL', { DATABASE_URL: 'postgres://app:pw@db.internal/kedgewise' }],
    ['DATABASE_URL', { DATABASE_URL: 'postgres://app:pw@127.0.0.1/kedgewise?host=db.internal' }],
    ['APP_ORIGIN', { APP_ORIGIN: 'https://anchors.example' }],
  ])('keeps the demo on loopback: %s', (name, change) => {
    expect(problems({ ...demo, ...change }).some(problem => problem.startsWith(name))).toBe(true)
  })

  it('refuses a demo switch that is neither on nor off', () => {
    expect(problems({ ...production, KEDGEWISE_DEMO: 'yes' })[0]).toContain('KEDGEWISE_DEMO')
  })
})
