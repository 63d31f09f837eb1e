import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type * as z from 'zod/mini'
import { designAnswer, designNamesAnswer, designsAnswer, seabedAnswer, trialAnswer, trialPullsAnswer, trialsAnswer } from '#shared/schemas/answers/reading'
import type { EstimatesAnswer } from '#shared/types/catalogue'
import type { DesignAnswer, DesignsPage, SeabedAnswer, TrialAnswer, TrialPullsAnswer, TrialsAnswer } from '#shared/types/reading'
import { numberedSeabeds, seabeds } from '#shared/types/words'
import { expectProblem, get, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
let client: pg.Client
beforeAll(async () => {
  app = await startApp(unlimited)
  client = new pg.Client({ connectionString: app.databaseUrl })
  client.on('error', () => {})
  await client.connect()
})
afterAll(async () => {
  await client?.end()
  await app?.stop()
})

async function read<T>(path: string, schema: z.ZodMiniType): Promise<T> {
  const { status, body } = await get(app.baseUrl + path)
  expect(status, `${path} ${JSON.stringify(body)}`).toBe(200)
  expect(schema.safeParse(body).error, path).toBeUndefined()
  return body as unknown as T
}
const designs = (query = '') => read<DesignsPage>(`/api/designs${query}`, designsAnswer)
const count = async (sql: string) => Number((await client.query<{ n: string }>(`select count(*) n from ${sql}`)).rows[0]?.n)

describe('GET /api/designs', () => {
  it('narrows as asked, and says how many there are', async () => {
    const all = await designs()
    expect(all).toMatchObject({ page: 1, pages: 1, total: await count('designs') })
    const check = async (query: string, wanted: (design: DesignsPage['designs'][number]) => boolean) => {
      const { designs: found } = await designs(query)
      expect(found.map(({ slug }) => slug), query).toEqual(all.designs.filter(wanted).map(({ slug }) => slug))
    }
    await check('?family=claw', ({ family }) => family === 'claw')
    await check('?seabed=weed-over-sand', ({ tested }) => tested.some(({ seabed }) => seabed === 'weed-over-sand'))
    await check('?massKg=15', ({ sizes }) => sizes.some(({ massKg }) => massKg >= 12.5 && massKg <= 18))
    await check('?tested=no', ({ pulls }) => pulls === 0)
    await check('?tested=yes', ({ pulls }) => pulls > 0)
    await check('?search=FENN', ({ name, description }) => /fenn/i.test(name + description))
    await check('?search=%25', ({ description }) => description.includes('%'))
    await check('?search=roll-bar%20scoop', ({ familyName, description, name }) => /roll-bar scoop/i.test(`${familyName}|${description}|${name}`))
    await check('?search=_', () => false)
    expect((await designs('?page=2')).designs).toEqual([])
  })

  it('orders as asked', async () => {
    const { designs: byPulls } = await designs('?sort=pulls')
    expect(byPulls.map(({ pulls }) => pulls)).toEqual(byPulls.map(({ pulls }) => pulls).toSorted((a, b) => b - a))
    const { estimates } = (await get(`${app.baseUrl}/api/estimates?seabed=firm-mud`)).body as unknown as EstimatesAnswer
    const expected = estimates.filter(({ pulls }) => pulls > 0).toSorted((a, b) => b.lnMean15Kg - a.lnMean15Kg).map(({ design }) => design)
    expect((await designs('?sort=holding&seabed=firm-mud')).designs.map(({ slug }) => slug)).toEqual(expected)
  })

  it('gives every name for a choice', async () => {
    const { designs: names } = await read<{ designs: { slug: string }[] }>('/api/design-names', designNamesAnswer)
    expect(names).toHaveLength(await count('designs'))
  })
})

describe('GET /api/designs/{slug}', () => {
  it('says of every design what the database and the fit say', async () => {
    for (const { slug, tested } of (await designs()).designs) {
      const answer = await read<DesignAnswer>(`/api/designs/${slug}?massKg=15`, designAnswer)
      const { estimates } = (await get(`${app.baseUrl}/api/estimates?design=${slug}`)).body as unknown as EstimatesAnswer
      expect(answer.seabeds.length).toBe(estimates.length)
      for (const { seabed, holding15KgN, pulls } of estimates) {
        const own = answer.seabeds.find(one => one.seabed === seabed)
        expect(own?.holdingN?.median).toBeCloseTo(holding15KgN.median, 6)
        expect(own?.holdingN?.low90).toBeCloseTo(holding15KgN.low90, 6)
        expect(own?.pulls).toBe(pulls)
        // Every pull that entered the fit is a tick.
        expect(own?.ticks.length).toBe(pulls)
      }
      expect(answer.manner.pulls).toBe(await count(`pulls p join designs d on d.id = p.design_id where d.slug = '${slug}' and p.modification_id is null and p.superseded_by_id is null`))
      expect(answer.manner.setting.reduce((sum, one) => sum + one.count, 0)).toBe(answer.manner.pulls)
      expect(answer.seabeds.filter(({ pulls }) => pulls > 0).map(({ seabed }) => seabed).sort()).toEqual(tested.map(({ seabed }) => seabed).sort())
    }
  })
})

describe('GET /api/seabeds/{slug}', () => {
  it.each(seabeds)('%s', async (slug) => {
    const answer = await read<SeabedAnswer>(`/api/seabeds/${slug}?massKg=20`, seabedAnswer)
    expect(answer.rows.map(({ rank }) => rank)).toEqual(answer.rows.map((_, index) => index + 1))
    const medians = answer.rows.map(({ holdingN }) => holdingN.median)
    expect(medians).toEqual(medians.toSorted((a, b) => b - a))
    for (const { pulls, days } of answer.rows) expect(pulls >= 5 && days >= 2).toBe(true)
    for (const { pulls, days } of answer.thin) expect(pulls > 0 && (pulls < 5 || days < 2)).toBe(true)
    for (const { ticks, pulls } of [...answer.rows, ...answer.thin]) expect(ticks.length).toBe(pulls)
    const pulled = await count(`pulls where seabed = '${slug}'`) > 0
    expect(answer.rows.length > 0).toBe(pulled)
    if (!(numberedSeabeds as readonly string[]).includes(slug)) expect(answer.rows).toEqual([])
  })
})

describe('GET /api/trials', () => {
  it('lists every published trial with what was pulled in it, newest first', async () => {
    const answer = await read<TrialsAnswer>('/api/trials', trialsAnswer)
    expect(answer.total).toBe(await count('trials'))
    expect(answer.trials.reduce((sum, { pulls }) => sum + pulls, 0)).toBe(await count('pulls where superseded_by_id is null'))
    const days = answer.trials.map(({ day }) => day)
    expect(days).toEqual(days.toSorted().toReversed())
    const narrowed = await read<TrialsAnswer>('/api/trials?seabed=stiff-clay', trialsAnswer)
    expect(narrowed.trials).toEqual(answer.trials.filter(trial => trial.seabeds.includes('stiff-clay')))
  })

  it('shows every pull, and the plain mean of what was held beside the estimate', async () => {
    const { trials } = await read<TrialsAnswer>('/api/trials', trialsAnswer)
    for (const { slug, pulls: wanted } of trials) {
      const { pulls } = await read<TrialPullsAnswer>(`/api/trials/${slug}/pulls`, trialPullsAnswer)
      const { comparisons } = await read<TrialAnswer>(`/api/trials/${slug}`, trialAnswer)
      expect(pulls).toHaveLength(wanted)
      for (const { design, massKg, seabed, meanN, pulls: n, reason, estimateN } of comparisons) {
        const own = pulls.filter(pull => pull.design === design && pull.massKg === massKg && pull.seabed === seabed && pull.modification === null && pull.setting !== 'fouled')
        expect(n).toBe(own.length)
        expect(meanN).toBeCloseTo(own.reduce((sum, { heldN }) => sum + heldN, 0) / own.length, 6)
        expect(reason).toMatch(/^[A-Z].*[.]$/)
        expect(estimateN).not.toBeNull()
      }
    }
  })

  it('knows nothing of a trial that is not published', async () => {
    await client.query('update trials set published_at = null where slug = \'ouzel-bar-2025-04-09\'')
    try {
      for (const path of ['', '/pulls']) expectProblem(await get(`${app.baseUrl}/api/trials/ouzel-bar-2025-04-09${path}`), 404)
      const { trials } = await read<TrialsAnswer>('/api/trials', trialsAnswer)
      expect(trials.map(({ slug }) => slug)).not.toContain('ouzel-bar-2025-04-09')
    }
    finally {
      await client.query('update trials set published_at = now() where slug = \'ouzel-bar-2025-04-09\'')
    }
  })
})

describe('what is not there', () => {
  const names = ['no-such', 'UPPER', '__proto__', 'constructor', '%27%20or%201%3D1', '%00', '..%2f..', 'x'.repeat(3000), '%F0%9F%9A%A2']
  it.each(['/api/designs/', '/api/seabeds/', '/api/trials/'])('%s', async (path) => {
    for (const name of names) expectProblem(await get(app.baseUrl + path + name), 404)
  })

  it.each(['/designs/', '/seabeds/', '/trials/'])('%s is a 404 page', async (path) => {
    for (const name of ['no-such', '__proto__', '%27%20or%201%3D1', '%00', 'x'.repeat(3000)]) {
      const answer = await fetch(app.origin + path + name, { headers: { Accept: 'text/html' } })
      expect(answer.status, name).toBe(404)
      expect(answer.headers.get('content-type')).toMatch(/^text\/html/)
      expect(await answer.text()).toContain('No page is charted here')
    }
  })
})

describe('absurd queries', () => {
  const absurd = ['page=0', 'page=-1', 'page=1.5', 'page=1e9', 'page=999999999999999999999', 'page=', 'massKg=0', 'massKg=1e400', 'massKg=NaN', 'massKg=-5', 'sort=worst', 'tested=maybe', 'family=none', 'seabed=rock', 'x=1', '__proto__=1',
    'search=', 'search=%00', `search=${'x'.repeat(61)}`, 'search=a&search=b']
  it.each(absurd)('/api/designs?%s is refused', async (query) => {
    expectProblem(await get(`${app.baseUrl}/api/designs?${query}`), 422)
  })

  it.each(['/api/designs/fennigar?massKg=0', '/api/seabeds/silt?massKg=many', '/api/trials?seabed=coral', '/api/trials?design=A', '/api/trials/x?x=1', '/api/design-names?x=1'])('%s is refused', async (path) => {
    expectProblem(await get(app.baseUrl + path), 422)
  })

  it.each(['/designs', '/trials', '/seabeds', '/designs/fennigar', '/seabeds/silt'])('%s ignores them and says so', async (path) => {
    for (const query of ['page=-1', 'page=1e9', 'family=none&seabed=rock&mass=lots&tested=maybe&sort=worst', 'chart=%00%01', 'mass=1e400', `search=${'x'.repeat(90)}`, 'seabed=%27', 'x=1', '%00=%00', 'page=99']) {
      const answer = await fetch(`${app.origin}${path}?${query}`, { headers: { Accept: 'text/html' } })
      expect(answer.status, query).toBe(200)
    }
    const key = path === '/seabeds' ? 'chart' : path.split('/').length > 2 ? 'mass' : 'seabed'
    expect(await (await fetch(`${app.origin}${path}?${key}=${key === 'chart' ? '%01' : 'lots'}`)).text()).toContain('Ignored: “')
  })
})
