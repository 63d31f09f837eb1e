import { Worker } from 'node:worker_threads'
import type { FitAnswer, FitRequest } from '#shared/types/fit'
import type { HoldingFit, PullRecord } from '#shared/types/holding'
import { workerFile } from '../utils/places'

export type FitTask =
  | { kind: 'refit', pulls: PullRecord[] }
  | { kind: 'ask', request: FitRequest }

/** The fit took longer than it was given. */
export class FitTimeout extends Error {}

/** Runs one task in a worker thread of its own and ends the thread, however that goes. */
function inWorker<Answer>(task: FitTask, limitMs: number, signal?: AbortSignal): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const worker = new Worker(workerFile('fit'), { workerData: task, resourceLimits: { maxOldGenerationSizeMb: 1024 } })
    const finish = (settle: () => void) => {
      clearTimeout(timer)
      signal?.removeEventListener('abort', abort)
      settle()
      void worker.terminate()
    }
    const abort = () => finish(() => reject(new Error('the fit was given up')))
    const timer = setTimeout(() => finish(() => reject(new FitTimeout(`the fit took longer than ${limitMs / 1000} s`))), limitMs)
    worker.on('message', (answer: Answer) => finish(() => resolve(answer)))
    worker.on('error', error => finish(() => reject(error)))
    worker.on('exit', code => finish(() => reject(new Error(`the fit's worker ended early with code ${code}`))))
    signal?.addEventListener('abort', abort)
  })
}

/** Fits all pulls; at most ten minutes. */
export const runRefit = (pulls: PullRecord[], signal?: AbortSignal) =>
  inWorker<HoldingFit>({ kind: 'refit', pulls }, 600_000, signal)

/** What would these pulls say? At most 30 s, then FitTimeout; ended when nobody waits for it any more. */
export const runFit = (request: FitRequest, signal?: AbortSignal) =>
  inWorker<FitAnswer>({ kind: 'ask', request }, 30_000, signal)
