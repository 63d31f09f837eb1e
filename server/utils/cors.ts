/** Calculations that pages of other origins may call: they read no cookie from there. */
const openRoutes = new Set(['/api/loads', '/api/rodes', '/api/rankings'])

export const isOpenToOthers = (path: string) => openRoutes.has(path)

/** On every answer of an open route, errors included: any origin may read it, never with credentials. */
export const openHeaders: Readonly<Record<string, string>> = {
  'Access-Control-Allow-Origin': '*',
  'Access-Control-Expose-Headers': 'Retry-After, X-Request-Id',
  'Cross-Origin-Resource-Policy': 'cross-origin',
}

/** On the answer to a preflight. */
export const preflightHeaders: Readonly<Record<string, string>> = {
  'Access-Control-Allow-Methods': 'POST',
  'Access-Control-Allow-Headers': 'Authorization, Content-Type',
  'Access-Control-Max-Age': '7200',
}
