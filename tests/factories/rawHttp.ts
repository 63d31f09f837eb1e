import { connect } from 'node:net'

export interface RawAnswer { status: number, head: string, body: string }

/**
 * Sends bytes as they are, which fetch would not: wrong lengths, endless bodies. Reads until the server ends the connection, or a
 * whole answer with a Content-Length has come, or the time is over.
 */
export function rawRequest(port: number, pieces: (string | Buffer)[], { pauseMs = 0, timeMs = 8000 } = {}): Promise<RawAnswer> {
  return new Promise((resolve, reject) => {
    const socket = connect(port, '127.0.0.1')
    let text = ''
    const timer = setTimeout(() => finish(), timeMs)
    const finish = () => {
      clearTimeout(timer)
      socket.destroy()
      const [head = '', body = ''] = text.split('\r\n\r\n')
      const status = Number(/^HTTP\/1\.1 (\d{3})/.exec(head)?.[1])
      if (Number.isNaN(status)) reject(new Error(`no answer: ${JSON.stringify(text)}`))
      else resolve({ status, head, body })
    }
    socket.setEncoding('utf8')
    socket.on('data', (chunk) => {
      text += String(chunk)
      const length = /content-length: (\d+)/i.exec(text)?.[1]
      if (length !== undefined && (text.split('\r\n\r\n')[1] ?? '').length >= Number(length)) finish()
    })
    socket.on('close', finish)
    socket.on('error', () => {})
    void (async () => {
      for (const piece of pieces) {
        if (socket.destroyed) return
        if (!socket.write(piece)) await new Promise(done => socket.once('drain', done).once('close', done))
        if (pauseMs > 0) await new Promise(done => setTimeout(done, pauseMs))
      }
    })()
  })
}

/** A chunk of a chunked body. */
export const chunk = (text: string) => `${Buffer.byteLength(text).toString(16)}\r\n${text}\r\n`
