import * as z from 'zod/mini'
import { fieldsOf, listOf, slug } from './fields'
import { massKg, rankingRequest } from './ranking'

export const mostCompared = 4

const anchor = fieldsOf({
  design: slug('Design of the anchor'),
  massKg: z.optional(massKg),
}, 'An anchor: a design, at a mass or at the common one')

/** POST /api/comparisons */
export const comparisonRequest = fieldsOf({
  anchors: listOf(anchor, 2, mostCompared, 'Anchors to compare'),
  massKg: z.optional(massKg),
  plan: z.optional(rankingRequest),
}, 'Which of these holds more? For a plan, else for a flat pull on every seabed they were pulled on')
