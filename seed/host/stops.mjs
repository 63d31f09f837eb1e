// What has been started and must be stopped again, however this process is asked to end.
const stops = []
let ending = null

/** Remembers how to stop something; hands back the way to forget it. */
export function onStop(stop) {
  stops.push(stop)
  return () => {
    const place = stops.lastIndexOf(stop)
    if (place >= 0) stops.splice(place, 1)
  }
}

/** Stops everything, last started first; one thing that fails does not keep the rest running. */
export function stopEverything() {
  ending ??= (async () => {
    while (stops.length) {
      try {
        await stops.pop()()
      }
      catch (error) {
        console.error(error.message)
      }
    }
  })()
  return ending
}

export const isStopping = () => ending !== null

/** From now on Ctrl-C, SIGTERM and a closed terminal stop everything before the process ends. */
export function stopOnSignals() {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, async () => {
      if (isStopping()) return
      process.stdout.write('\nStopping\n')
      await stopEverything()
      process.exit(0)
    })
  }
}

/** Runs `work` with everything it starts stopped at its end; sets the exit code. */
export async function runAndStop(work) {
  stopOnSignals()
  try {
    process.exitCode = await work() ?? 0
  }
  catch (error) {
    if (!isStopping()) console.error(error.message)
    process.exitCode = 1
  }
  finally {
    await stopEverything()
  }
}
