import * as z from 'zod/mini'
import { fieldsOf } from '../fields'
import { figure, list, words } from './figures'

const strengthPart = fieldsOf({
  part: words('Part of the rode'),
  breakingN: z.nullable(figure('N', 'Breaking strength; null where unknown')),
  allowedN: z.nullable(figure('N', 'Allowed load; null where unknown')),
  loadN: figure('N', 'Greatest tension in it'),
  ok: z.nullable(z.boolean()),
}, 'Strength of one part; an unknown strength is never ok')

export const rodeAnswer = fieldsOf({
  regime: z.enum(['grounded', 'lifting', 'clear']),
  shankAngleDeg: figure('degrees', 'How far the rode lifts from the seabed at the shank'),
  groundedChainM: figure('m', 'Chain on the bottom'),
  groundedRopeM: figure('m', 'Rope on the bottom'),
  spanM: figure('m', 'Anchor to bow, horizontally'),
  tensionBowN: figure('N', 'Tension at the bow'),
  tensionAnchorN: figure('N', 'Tension at the anchor'),
  verticalAnchorN: figure('N', 'Upward pull at the anchor'),
  scope: figure('', 'Rode out over height'),
  leastLengthZeroAngleM: z.nullable(figure('m', 'Least rode for a shank angle of 0; null where no length gives it')),
  leastLength8DegM: z.nullable(figure('m', 'Least rode for a shank angle of 8 degrees; null where no length gives it')),
  upliftFactor: figure('', 'Share of holding left at the shank angle'),
  curve: list(z.tuple([z.number(), z.number()]), 'Points from the anchor [0, 0] to the bow, m'),
  strength: list(strengthPart, 'Every part with a load on it'),
  weakest: z.nullable(words('The part with least in hand')),
}, 'How the pull reaches the anchor')
