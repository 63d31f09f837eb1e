// Preloaded into the server under measurement: on SIGUSR2 it prints the event loop's delay since the last time it was asked.
import { monitorEventLoopDelay } from 'node:perf_hooks'

const delay = monitorEventLoopDelay({ resolution: 1 })
delay.enable()
process.on('SIGUSR2', () => {
  const ms = nanoseconds => Math.round(nanoseconds / 1e4) / 100
  process.stdout.write(`loop-delay ${JSON.stringify({ p50: ms(delay.percentile(50)), p99: ms(delay.percentile(99)), max: ms(delay.max) })}\n`)
  delay.reset()
})
