import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { questionAnswer } from '#shared/schemas/answers/reading'
import type { TrialAnswer, TrialPullsAnswer } from '#shared/types/reading'
import { expectProblem, get, post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
let client: pg.Client
let pullId: number
const trial = 'tarrack-bight-2024-09-04'
beforeAll(async () => {
  app = await startApp(unlimited)
  client = new pg.Client({ connectionString: app.databaseUrl })
  client.on('error', () => {})
  await client.connect()
  const { pulls } = (await get(`${app.baseUrl}/api/trials/${trial}/pulls`)).body as unknown as TrialPullsAnswer
  pullId = pulls[2]?.id ?? 0
})
afterAll(async () => {
  await client?.end()
  await app?.stop()
})

const asked = { question: 'The load went down before it moved.\nWas the cell zeroed?', mailAddress: 'reader@example.org' }
const ask = (id: number | string, body: unknown) => post(`${app.baseUrl}/api/pulls/${id}/questions`, body)

describe('POST /api/pulls/{id}/questions', () => {
  it.each([
    ['no question', { mailAddress: asked.mailAddress }, 'question'], ['a short one', { ...asked, question: 'What?' }, 'question'], ['blanks', { ...asked, question: ' '.repeat(50) }, 'question'],
    ['a long one', { ...asked, question: 'x'.repeat(2001) }, 'question'], ['control characters', { ...asked, question: 'a question with \u0000 in it' }, 'question'],
    ['no address', { question: asked.question }, 'mailAddress'], ['half an address', { ...asked, mailAddress: 'reader@' }, 'mailAddress'], ['two lines', { ...asked, mailAddress: 'a@example.org\nBcc: b@example.org' }, 'mailAddress'],
    ['a long address', { ...asked, mailAddress: `${'x'.repeat(250)}@example.org` }, 'mailAddress'], ['an unknown key', { ...asked, state: 'closed' }, 'state'],
  ])('refuses %s by the field', async (_, body, field) => {
    const answer = await ask(pullId, body)
    expectProblem(answer, 422)
    expect(Object.keys(answer.body.fields as object)).toEqual([field])
  })

  it.each(['0', '-1', 'x', '1e3', '99999999999', '1;drop', '%00'])('refuses %s as the number of a pull', async (id) => {
    const answer = await ask(id, asked)
    expect([404, 422]).toContain(answer.status)
    expectProblem(answer, answer.status)
  })

  it('keeps it for the reviewers, shows it to nobody, and hears five from one address at once', async () => {
    expectProblem(await ask(2_000_000_000, asked), 404)
    for (let i = 0; i < 4; i++) {
      const answer = await ask(pullId, { ...asked, state: undefined })
      expect(answer.status, JSON.stringify(answer.body)).toBe(201)
      expect(questionAnswer.safeParse(answer.body).error).toBeUndefined()
      expect(answer.body.pullId).toBe(pullId)
    }
    const refused = await ask(pullId, asked)
    expectProblem(refused, 429)
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0)
    const { rows } = await client.query('select pull_id, question, mail_address, state from pull_questions order by id')
    expect(rows).toHaveLength(4)
    expect(rows[0]).toEqual({ pull_id: pullId, question: asked.question, mail_address: asked.mailAddress, state: 'open' })
    for (const path of [`/api/trials/${trial}`, `/api/trials/${trial}/pulls`, `/trials/${trial}`]) {
      expect(await (await fetch(app.origin + path)).text()).not.toContain(asked.mailAddress)
    }
  })
})

describe('a reply to a trial', () => {
  it('stands on its page, as text', async () => {
    await client.query('insert into trial_replies (trial_id, author, reply) select id, $2, $3 from trials where slug = $1', [trial, 'Maker of Ulvesk', 'The bar was <b>bent</b> before.'])
    const { replies } = (await get(`${app.baseUrl}/api/trials/${trial}`)).body as unknown as TrialAnswer
    expect(replies).toEqual([{ author: 'Maker of Ulvesk', reply: 'The bar was <b>bent</b> before.', publishedAt: expect.stringMatching(/^\d{4}-.*Z$/) }])
    const html = await (await fetch(`${app.origin}/trials/${trial}`)).text()
    expect(html).toContain('The bar was &lt;b&gt;bent&lt;/b&gt; before.')
    expect(html).not.toContain('Nobody has replied')
  })
})
