import { defineEventHandler } from 'h3'
import { countRequest } from '../utils/limits'
import { pathOf } from '../utils/request'

/** Whatever is rendered costs as much as a calculation and counts like one; files were served before this. */
export default defineEventHandler((event) => {
  if (!/^\/api(?:\/|$)/.test(pathOf(event))) countRequest(event)
})
