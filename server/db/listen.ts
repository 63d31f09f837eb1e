import pg from 'pg'

const retryMs = 1000

/**
 * Calls `heard` for every NOTIFY on `channel`, and once after each (re)connection, since a notice may have been
 * missed meanwhile. Keeps trying through a database restart. Hands back the way to stop.
 */
export function listen(url: string, channel: string, heard: () => void): () => Promise<void> {
  let stopped = false
  let client: pg.Client | null = null
  let timer: NodeJS.Timeout | undefined

  async function open() {
    const fresh = new pg.Client({ connectionString: url, connectionTimeoutMillis: 2000, keepAlive: true, application_name: `kedgewise ${channel}` })
    let lost = false
    const again = () => {
      if (lost) return
      lost = true
      fresh.end().catch(() => {})
      if (!stopped) timer = setTimeout(open, retryMs)
    }
    fresh.on('error', again)
    fresh.on('end', again)
    fresh.on('notification', heard)
    try {
      await fresh.connect()
      await fresh.query(`listen ${pg.escapeIdentifier(channel)}`)
      client = fresh
      heard()
    }
    catch {
      again()
    }
  }

  void open()
  return async () => {
    stopped = true
    clearTimeout(timer)
    await client?.end().catch(() => {})
  }
}
