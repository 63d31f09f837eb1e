import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { examples } from '../../server/utils/examples'
import { operations } from '../../server/utils/operations'
import { unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

describe('the example of a route', () => {
  it('is there wherever something must be sent or named, and for no other route', () => {
    const needy = operations.filter(({ request, params }) => request || params).map(({ id }) => id)
    expect(needy.filter(id => !examples[id])).toEqual([])
    expect(Object.keys(examples).filter(id => !operations.some(operation => operation.id === id))).toEqual([])
  })

  it.each(operations.map(operation => [`${operation.method} ${operation.path}`, operation] as const))('%s is answered', async (_, { id, path, method, status = 200 }) => {
    const { address = {}, body } = examples[id] ?? {}
    const [inPath, inQuery] = [Object.entries(address).filter(([name]) => path.includes(`{${name}}`)), Object.entries(address).filter(([name]) => !path.includes(`{${name}}`))]
    const place = inPath.reduce((text, [name, value]) => text.replace(`{${name}}`, String(value)), path)
    const query = new URLSearchParams(inQuery.map(([name, value]) => [name, String(value)])).toString()
    const answer = await fetch(`${app.baseUrl}${place}${query && `?${query}`}`, {
      method, ...(body !== undefined && { body: JSON.stringify(body), headers: { 'Content-Type': 'application/json' } }),
    })
    expect(answer.status, (await answer.text()).slice(0, 300)).toBe(status)
  })
})
