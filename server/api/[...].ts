import { defineEventHandler } from 'h3'
import { notFound } from '../utils/problem'

/** Whatever no route of the API answers. */
export default defineEventHandler(() => {
  throw notFound()
})
