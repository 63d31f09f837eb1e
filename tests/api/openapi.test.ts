import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { readdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { get, unlimited } from './client'
import { startApp, type TestApp } from './harness'

interface Media { content?: Record<string, { schema: { $ref?: string } }> }
interface Described { operationId: string, requestBody?: Media, responses: Record<string, Media> }
interface Document { openapi: string, paths: Record<string, Record<string, Described>>, components: { schemas: Record<string, Record<string, unknown>> } }

let app: TestApp
let document: Document
beforeAll(async () => {
  app = await startApp(unlimited)
  document = (await get(`${app.baseUrl}/api/openapi.json`)).body as unknown as Document
})
afterAll(() => app.stop())

const references = (value: unknown): string[] => {
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, part]) => key === '$ref' && typeof part === 'string' ? [part] : references(part))
}

describe('GET /api/openapi.json', () => {
  it('is OpenAPI 3.1', () => {
    expect(document.openapi).toBe('3.1.0')
  })

  it('describes every route there is, and none that is not', () => {
    const files = readdirSync(fileURLToPath(new URL('../../server/api', import.meta.url)), { recursive: true, encoding: 'utf8' })
    const routes = files.filter(name => name.endsWith('.ts') && !name.startsWith('[...')).map((name) => {
      const parts = name.replace(/\.ts$/, '').split('.')
      const method = parts.pop()
      return `${method} /api/${parts.join('.').replace(/\/index$/, '').replaceAll('[', '{').replaceAll(']', '}')}`
    })
    const described = Object.entries(document.paths).flatMap(([path, methods]) => Object.keys(methods).map(method => `${method} ${path}`))
    expect(described.sort()).toEqual(routes.sort())
  })

  it('describes what each calculation takes and answers, and every refusal in the one shape', () => {
    for (const name of ['loads', 'rodes', 'rankings', 'fits']) {
      const { operationId, requestBody, responses } = document.paths[`/api/${name}`]?.post ?? { operationId: '', responses: {} }
      expect(operationId).toBe(name)
      expect(requestBody?.content?.['application/json']?.schema.$ref).toMatch(/Request$/)
      expect(responses['200']?.content?.['application/json']?.schema.$ref).toMatch(/Answer$/)
      for (const status of ['400', '405', '413', '415', '422', '429', '500']) {
        expect(responses[status]?.content?.['application/json']?.schema.$ref, `${name} ${status}`).toBe('#/components/schemas/Problem')
      }
    }
  })

  it('refers to nothing that is not there', () => {
    for (const reference of references(document)) expect(document.components.schemas).toHaveProperty([reference.replace('#/components/schemas/', '')])
  })

  it('says units and ranges, and that unknown keys are refused', () => {
    const loads = document.components.schemas.LoadsRequest as { additionalProperties: boolean, properties: { boat: { properties: { lengthM: unknown } } } }
    expect(loads.additionalProperties).toBe(false)
    expect(loads.properties.boat.properties.lengthM).toEqual({ type: 'number', minimum: 2, maximum: 80, description: 'Length overall (m)' })
  })
})
