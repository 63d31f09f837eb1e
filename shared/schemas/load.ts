import * as z from 'zod/mini'
import { exposures, swells, windKinds } from '#shared/types/words'
import { boat } from './boat'
import { fieldsOf, oneOf, quantity, yesOrNo } from './fields'
import { rode } from './rode'

export const wind = fieldsOf({
  speedMs: quantity(0.1, 100, 'm/s', 'Wind speed as entered'),
  kind: oneOf(windKinds, 'Whether the speed is a mean or a gust'),
  exposure: z.optional(oneOf(exposures, 'How gusty the wind is there; offshoreWind if left out')),
  at10m: z.optional(yesOrNo('The speed is a forecast for 10 m height; false if left out')),
  sheerDeg: z.optional(quantity(0, 90, 'degrees', 'Greatest angle that the boat sheers to')),
}, 'The wind that the plan is for')

export const currentMs = quantity(0, 5, 'm/s', 'Current past the boat: 0, or 0.05 to 5').check(
  z.refine(speed => speed === 0 || speed >= 0.05, { error: 'must be 0, or a number between 0.05 and 5 m/s' }),
)
export const swell = oneOf(swells, 'How the boat surges; none if left out')

/** POST /api/loads: with swell the surge needs the rode and its height. */
export const loadRequest = fieldsOf({
  boat,
  wind,
  currentMs: z.optional(currentMs),
  swell: z.optional(swell),
  rode: z.optional(rode),
  heightM: z.optional(quantity(0.1, 500, 'm', 'Seabed to bow')),
}, 'A boat and the wind, what the anchor must hold?').check(z.superRefine((request, context) => {
  if (request.swell === undefined || request.swell === 'none') return
  for (const field of ['rode', 'heightM'] as const) {
    if (request[field] === undefined) {
      context.addIssue({ code: 'custom', path: [field], input: request, message: 'is missing: with swell the surge depends on it' })
    }
  }
}))
