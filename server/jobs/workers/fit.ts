// Entry of the worker thread: fits take seconds, and the request path must not wait for them.
import { parentPort, workerData } from 'node:worker_threads'
import { fitHolding } from '#shared/holding/fitHolding'
import { answerFit } from '#shared/holding/whatWouldTheySay'
import type { FitTask } from '../../services/fitWorker'

const task = workerData as FitTask
parentPort?.postMessage(task.kind === 'refit' ? fitHolding(task.pulls) : answerFit(task.request))
