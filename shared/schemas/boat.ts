import * as z from 'zod/mini'
import { boatTypes } from '#shared/types/words'
import { fieldsOf, listOf, oneOf, quantity, shortText } from './fields'

export const areaM2 = quantity(0, 5000, 'm2', 'Area')
export const dragCoefficient = quantity(0, 3, '', 'Drag coefficient')

export const windagePart = fieldsOf({
  part: shortText(60, 'What the wind pushes on'),
  areaM2,
  dragCoefficient,
}, 'One part that the wind pushes on')

export const waterline = fieldsOf({
  lengthM: quantity(1, 80, 'm', 'Waterline length'),
  beamM: quantity(0.2, 30, 'm', 'Waterline beam; of a multihull all hulls together'),
  draughtM: quantity(0.05, 15, 'm', 'Draught'),
}, 'The hull below the water, for the current')

/** A boat as a reader gives it: type, length and beam; every other figure has a default marked as guessed. */
export const boat = fieldsOf({
  type: oneOf(boatTypes, 'Type of boat'),
  lengthM: quantity(2, 80, 'm', 'Length overall'),
  beamM: quantity(0.5, 30, 'm', 'Beam'),
  displacementKg: z.optional(quantity(20, 2_000_000, 'kg', 'Displacement as loaded')),
  freeboardM: z.optional(quantity(0.1, 12, 'm', 'Freeboard')),
  bowHeightM: z.optional(quantity(0.1, 12, 'm', 'Bow roller above the water')),
  windage: z.optional(listOf(windagePart, 1, 40, 'Parts that replace all default parts')),
  sideAreaM2: z.optional(quantity(0, 5000, 'm2', 'Area seen from abeam, for sheer')),
  sideDragCoefficient: z.optional(dragCoefficient),
  waterline: z.optional(waterline),
  propellerAreaM2: z.optional(quantity(0, 20, 'm2', 'Blade area of a locked propeller')),
}, 'A boat')
