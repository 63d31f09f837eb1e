import { createServer, connect, type Socket } from 'node:net'
import { freePort } from '../../seed/host/shell.mjs'

/** A statement as the server sent it to PostgreSQL. */
export interface Statement { sql: string, params: (string | null)[] }

const text = (bytes: Buffer, from: number): { value: string, next: number } => {
  const end = bytes.indexOf(0, from)
  return { value: bytes.toString('utf8', from, end), next: end + 1 }
}

/** The values of a Bind message: portal, statement, format codes, then each value with its length. */
function boundValues(body: Buffer): (string | null)[] {
  let at = text(body, text(body, 0).next).next
  at += 2 + 2 * body.readInt16BE(at)
  const values: (string | null)[] = []
  for (let left = body.readInt16BE(at), place = at + 2; left > 0; left--) {
    const length = body.readInt32BE(place)
    place += 4
    values.push(length < 0 ? null : body.toString('utf8', place, place + length))
    place += Math.max(0, length)
  }
  return values
}

/** Reads what one client says in PostgreSQL's protocol, version 3: a start-up message without a type, then typed ones. */
function listener(heard: (application: string, statement: Statement) => void): (chunk: Buffer) => void {
  let rest: Buffer = Buffer.alloc(0)
  let application: string | null = null
  let parsed = ''
  const take = (type: string, body: Buffer) => {
    if (type === 'Q') heard(application ?? '', { sql: text(body, 0).value, params: [] })
    if (type === 'P') parsed = text(body, text(body, 0).next).value
    if (type === 'B') heard(application ?? '', { sql: parsed, params: boundValues(body) })
  }
  return (chunk) => {
    rest = Buffer.concat([rest, chunk])
    for (;;) {
      const head = application === null ? 0 : 1
      if (rest.length < head + 4) return
      const length = head + rest.readInt32BE(head)
      if (rest.length < length) return
      const body = rest.subarray(head + 4, length)
      if (application === null) {
        const words = body.toString('utf8', 4).split('\0')
        application = words[words.indexOf('application_name') + 1] ?? ''
      }
      else take(String.fromCharCode(rest[0] ?? 0), body)
      rest = rest.subarray(length)
    }
  }
}

/**
 * Stands between a server and its database and writes down every statement of its own pool (the job queue and the listener
 * have connections of their own, under other names).
 */
export async function listenIn(databaseUrl: string) {
  const target = new URL(databaseUrl)
  const statements: Statement[] = []
  const sockets = new Set<Socket>()
  const hear = (application: string, statement: Statement) => {
    if (application === 'kedgewise') statements.push(statement)
  }
  const proxy = createServer((client) => {
    const database = connect(Number(target.port), target.hostname)
    const listen = listener(hear)
    client.on('data', listen)
    for (const socket of [client, database]) {
      sockets.add(socket)
      socket.on('error', () => {}).on('close', () => sockets.delete(socket))
    }
    client.pipe(database).pipe(client)
  })
  const port = await freePort()
  await new Promise<void>(resolve => proxy.listen(port, '127.0.0.1', resolve))
  const url = new URL(databaseUrl)
  url.hostname = '127.0.0.1'
  url.port = String(port)
  return {
    url: url.href,
    /** What was said while `work` ran. */
    during: async (work: () => Promise<unknown>): Promise<Statement[]> => {
      const from = statements.length
      await work()
      return statements.slice(from)
    },
    /** What was said in the quietest of three runs: the server's own jobs speak through the same pool now and then. */
    quietest: async (work: () => Promise<unknown>): Promise<Statement[]> => {
      const runs: Statement[][] = []
      for (let run = 0; run < 3; run++) {
        const from = statements.length
        await work()
        runs.push(statements.slice(from))
      }
      return runs.reduce((least, one) => one.length < least.length ? one : least)
    },
    close: async () => {
      sockets.forEach(socket => socket.destroy())
      await new Promise<void>(resolve => proxy.close(() => resolve()))
    },
  }
}
