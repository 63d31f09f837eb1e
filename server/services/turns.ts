/** There was no place left to wait in. */
export class NoPlace extends Error {
  override name = 'NoPlace'
}

/** Whoever waited went away. */
export class GaveUp extends Error {
  override name = 'GaveUp'
}

interface Waiter { start: () => void }

/** One task at a time, and so many that may wait, first come first served. */
export class Turns {
  private busy = false
  private readonly line: Waiter[] = []

  constructor(private readonly mostWaiting: number) {}

  get waiting(): number {
    return this.line.length
  }

  /**
   * Runs the task when its turn comes.
   *
   * @param signal leaves the line when it ends
   * @throws NoPlace at once where the line is full; GaveUp where the signal ended first; else whatever the task throws
   */
  async run<T>(task: () => Promise<T>, signal?: AbortSignal): Promise<T> {
    if (this.busy) await this.wait(signal)
    this.busy = true
    try {
      if (signal?.aborted) throw new GaveUp()
      return await task()
    }
    finally {
      const next = this.line.shift()
      this.busy = next !== undefined
      next?.start()
    }
  }

  private wait(signal?: AbortSignal): Promise<void> {
    if (this.line.length >= this.mostWaiting) throw new NoPlace()
    return new Promise((resolve, reject) => {
      const leave = () => {
        const place = this.line.indexOf(waiter)
        if (place < 0) return
        this.line.splice(place, 1)
        reject(new GaveUp())
      }
      const waiter: Waiter = { start: () => {
        signal?.removeEventListener('abort', leave)
        resolve()
      } }
      this.line.push(waiter)
      if (signal?.aborted) leave()
      else signal?.addEventListener('abort', leave, { once: true })
    })
  }
}
