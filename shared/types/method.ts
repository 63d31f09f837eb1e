import type { NumberedSeabed } from './words'

/** The smallest real size that serves on one seabed, over all ranked designs; null where none of them serves. */
export interface ServingOnSeabed {
  seabed: NumberedSeabed
  ranked: number
  survey: { massKg: number | null, designs: number }
  table: { massKg: number | null, designs: number }
}

/** What one reference boat asks and what serves it. */
export interface ReferenceBoat {
  lengthM: number
  beamM: number
  surveyN: number
  tableN: number | null
  ruleTableKg: number | null
  seabeds: ServingOnSeabed[]
}

/** GET /api/reference-boats */
export interface ReferenceBoatsAnswer { fit: { id: number, modelVersion: string, at: string }, boats: ReferenceBoat[] }
