import { defineEventHandler, sendNoContent, setResponseHeaders } from 'h3'
import { isOpenToOthers, openHeaders, preflightHeaders } from '../utils/cors'
import { pathOf } from '../utils/request'

/** Opens the calculations to other origins, and answers the question that a browser asks first. */
export default defineEventHandler((event) => {
  if (!isOpenToOthers(pathOf(event))) return
  setResponseHeaders(event, openHeaders)
  if (event.method !== 'OPTIONS') return
  setResponseHeaders(event, { ...preflightHeaders, Allow: 'POST, OPTIONS' })
  return sendNoContent(event)
})
