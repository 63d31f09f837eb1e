import { isInternal } from '../utils/address'
import { isLoopback } from '../utils/configuration'

/**
 * The demo answers its own loopback names only, so that a page elsewhere cannot reach it under a foreign name
 * that leads to 127.0.0.1. People are sent to the one origin that everything else is made for.
 */
export default defineEventHandler((event) => {
  if (process.env.KEDGEWISE_DEMO !== '1' || isInternal(event)) return
  const host = getRequestHeader(event, 'host') ?? ''
  const name = host.replace(/:\d+$/, '')
  if (!isLoopback(name)) throw createError({ statusCode: 421, message: 'The demo answers on loopback only' })
  const origin = process.env.APP_ORIGIN ?? ''
  const isPage = event.method === 'GET' && (getRequestHeader(event, 'accept') ?? '').includes('text/html')
  if (isPage && origin && `http://${host}` !== origin && event.path.startsWith('/') && !/^\/[/\\]/.test(event.path)) {
    return sendRedirect(event, `${origin}${event.path}`, 302)
  }
})
