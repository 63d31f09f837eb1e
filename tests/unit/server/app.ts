import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { createApp, createRouter, toNodeListener, type EventHandler } from 'h3'
import cors from '../../../server/middleware/cors'
import methods from '../../../server/middleware/methods'
import { sendProblem } from '../../../server/utils/problem'

export interface LocalServer { url: string, port: number, stop: () => Promise<void> }

/** A server on loopback with the middleware that guards the API, the routes given, and the one error translator. */
export async function serve(routes: Record<string, EventHandler>, before: EventHandler[] = [cors, methods]): Promise<LocalServer> {
  const app = createApp({ onError: (error, event) => sendProblem(event, error) })
  const router = createRouter({ preemptive: true })
  for (const [path, handler] of Object.entries(routes)) router.use(path, handler)
  before.forEach(handler => app.use(handler))
  app.use(router)
  const server: Server = createServer(toNodeListener(app))
  await new Promise<void>(resolve => server.listen(0, '127.0.0.1', resolve))
  const { port } = server.address() as AddressInfo
  return { url: `http://127.0.0.1:${port}`, port, stop: () => new Promise((resolve) => {
    server.close(() => resolve())
    server.closeAllConnections()
  }) }
}
