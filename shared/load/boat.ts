import { boatTypes } from '#shared/types/words'
import type { BoatType } from '#shared/types/words'
import type { Boat, WindagePart } from '#shared/types/load'
import { FieldError } from '#shared/utils/fieldError'
import { within } from '#shared/load/within'
import { defaultSideAreaM2, defaultWindage } from '#shared/load/windage'

/** A boat as a reader gives it, the beam left out if need be. */
export type BoatInput = Omit<Boat, 'beamM'> & { beamM?: number }

/** A boat with nothing left out; `guessed` names every value that the reader did not give. */
export type CompleteBoat = Required<Boat> & { guessed: string[] }

/** Ratios of the guessed dimensions (ours): beam, waterline and draught to length, waterline beam to beam, displacement in kg to length cubed. */
const ratios: Readonly<Record<BoatType, { beam: number, waterlineBeam: number, draught: number, displacement: number }>> = {
  sailMonohull: { beam: 0.32, waterlineBeam: 0.85, draught: 0.16, displacement: 5.5 },
  sailMultihull: { beam: 0.55, waterlineBeam: 0.3, draught: 0.1, displacement: 5.5 },
  motor: { beam: 0.33, waterlineBeam: 0.9, draught: 0.08, displacement: 6.5 },
}

/** Waterline length over length overall where it is not given (ours). */
export const waterlineRatio = 0.88

function checkType(type: BoatType): BoatType {
  if (boatTypes.includes(type)) return type
  throw new FieldError('boat.type', `boat.type must be one of ${boatTypes.join(', ')}, got ${String(type)}`)
}

function checkParts(parts: readonly WindagePart[]): WindagePart[] {
  if (parts.length < 1 || parts.length > 50) throw new FieldError('boat.windage', `boat.windage must have between 1 and 50 parts, got ${parts.length}`)
  return parts.map(({ part, areaM2, dragCoefficient }, index) => ({
    part,
    areaM2: within(`boat.windage.${index}.areaM2`, areaM2, 0, 5000),
    dragCoefficient: within(`boat.windage.${index}.dragCoefficient`, dragCoefficient, 0, 3),
  }))
}

function checkWaterline(waterline: NonNullable<Boat['waterline']>): NonNullable<Boat['waterline']> {
  return {
    lengthM: within('boat.waterline.lengthM', waterline.lengthM, 0.5, 150),
    beamM: within('boat.waterline.beamM', waterline.beamM, 0.1, 50),
    draughtM: within('boat.waterline.draughtM', waterline.draughtM, 0.05, 20),
  }
}

/**
 * Fills in every value the reader left out, by the defaults of this program (all of them ours), and names each one in `guessed`.
 * Windage given replaces all default parts.
 *
 * @param boat length overall 1 to 150 m, beam 0.3 to 50 m, displacement 20 to 1e7 kg, freeboard and bow height 0.1 to 20 m, side area
 *   0 to 5000 m2, drag coefficients 0 to 3, propeller 0 to 20 m2
 * @throws RangeError outside those ranges, or for a list of windage without a part
 */
export function completeBoat(boat: BoatInput): CompleteBoat {
  const guessed: string[] = []
  const given = (name: keyof Boat & string, value: number | undefined, guess: number, min: number, max: number): number => {
    if (value !== undefined) return within(`boat.${name}`, value, min, max)
    guessed.push(name)
    return guess
  }
  const type = checkType(boat.type)
  const lengthM = within('boat.lengthM', boat.lengthM, 1, 150)
  const ratio = ratios[type]
  const beamM = given('beamM', boat.beamM, ratio.beam * lengthM, 0.3, 50)
  const freeboardM = given('freeboardM', boat.freeboardM, type === 'motor' ? 0.07 * lengthM + 0.6 : 0.06 * lengthM + 0.5, 0.1, 20)
  if (!boat.windage) guessed.push('windage')
  if (!boat.waterline) guessed.push('waterline')
  return {
    type,
    lengthM,
    beamM,
    freeboardM,
    bowHeightM: given('bowHeightM', boat.bowHeightM, 0.06 * lengthM + 0.5, 0.1, 20),
    displacementKg: given('displacementKg', boat.displacementKg, ratio.displacement * lengthM ** 3, 20, 1e7),
    windage: boat.windage ? checkParts(boat.windage) : defaultWindage({ type, lengthM, beamM, freeboardM }),
    sideAreaM2: given('sideAreaM2', boat.sideAreaM2, defaultSideAreaM2(type, lengthM), 0, 5000),
    sideDragCoefficient: given('sideDragCoefficient', boat.sideDragCoefficient, 1, 0, 3),
    waterline: boat.waterline
      ? checkWaterline(boat.waterline)
      : { lengthM: waterlineRatio * lengthM, beamM: ratio.waterlineBeam * beamM, draughtM: ratio.draught * lengthM },
    propellerAreaM2: given('propellerAreaM2', boat.propellerAreaM2, 0.05, 0, 20),
    guessed,
  }
}
