import { describe, expect, it } from 'vitest'
import type { FitAnswer } from '#shared/types/fit'
import { fits } from '../../../server/services/fits'
import { FitTimeout } from '../../../server/services/fitWorker'
import { GaveUp, NoPlace, Turns } from '../../../server/services/turns'
import { fitRequestExample } from '../../factories/requests'

function held<T>() {
  let release!: (value: T) => void
  const promise = new Promise<T>(resolve => release = resolve)
  return { promise, release }
}

describe('turns', () => {
  it('run one at a time, in order', async () => {
    const turns = new Turns(4)
    const log: string[] = []
    const task = (name: string) => turns.run(async () => {
      log.push(`${name} begins`)
      await new Promise(resolve => setTimeout(resolve, 5))
      log.push(`${name} ends`)
    })
    await Promise.all(['a', 'b', 'c'].map(task))
    expect(log).toEqual(['a begins', 'a ends', 'b begins', 'b ends', 'c begins', 'c ends'])
  })

  it('have so many places to wait', async () => {
    const turns = new Turns(2)
    const first = held<number>()
    const running = [turns.run(() => first.promise), turns.run(() => Promise.resolve(2)), turns.run(() => Promise.resolve(3))]
    await expect(turns.run(() => Promise.resolve(4))).rejects.toBeInstanceOf(NoPlace)
    first.release(1)
    expect(await Promise.all(running)).toEqual([1, 2, 3])
    expect(await turns.run(() => Promise.resolve(5))).toBe(5)
  })

  it('go on after a failure', async () => {
    const turns = new Turns(1)
    const failing = turns.run(() => Promise.reject(new Error('no')))
    const next = turns.run(() => Promise.resolve('yes'))
    await expect(failing).rejects.toThrow('no')
    expect(await next).toBe('yes')
  })

  it('free the place of whoever went away', async () => {
    const turns = new Turns(1)
    const first = held<string>()
    const away = new AbortController()
    const running = turns.run(() => first.promise)
    const waiting = turns.run(() => Promise.resolve('never'), away.signal)
    expect(turns.waiting).toBe(1)
    away.abort()
    await expect(waiting).rejects.toBeInstanceOf(GaveUp)
    expect(turns.waiting).toBe(0)
    const next = turns.run(() => Promise.resolve('next'))
    first.release('first')
    expect(await Promise.all([running, next])).toEqual(['first', 'next'])
  })
})

describe('fits', () => {
  it('beyond four that wait are refused with 429 and Retry-After', async () => {
    const first = held<FitAnswer>()
    const line = new Turns(4)
    const ask = () => fits(fitRequestExample(), undefined, () => first.promise, line)
    const running = Array.from({ length: 5 }, ask)
    await expect(ask()).rejects.toMatchObject({ statusCode: 429, code: 'busy', more: { headers: { 'Retry-After': '15' } } })
    const answer = { estimates: [] } as unknown as FitAnswer
    first.release(answer)
    expect(await Promise.all(running)).toHaveLength(5)
  })

  it('that take too long are refused with 422 and the field', async () => {
    await expect(fits(fitRequestExample(), undefined, () => Promise.reject(new FitTimeout('long')), new Turns(4)))
      .rejects.toMatchObject({ statusCode: 422, more: { fields: { pulls: 'must be fewer: this fit takes longer than 30 s' } } })
  })
})
