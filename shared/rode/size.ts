import { IN_M } from '#shared/units/constants'
import { FieldError, mustBeWithin } from '#shared/utils/fieldError'

/** A size as given: metric or inch, never both. */
export interface SizeGiven { diameterMm?: number, sizeIn?: string }

/** Diameter in mm; the inch value only where the size was given in inches, since inch lists are read by it alone. */
export interface Size { mm: number, inch: number | null }

/**
 * Reads an inch size: "5/16", "1 1/8", "1-1/8", "0.5" or "2", with or without a closing `"` or "in".
 *
 * @param text what was typed
 * @param field its name in the request
 * @returns inches, 1/16 to 12
 * @throws FieldError when it is not such a size
 */
export function parseInch(text: string, field: string): number {
  const bare = text.trim().replace(/\s*(?:"|″|in)$/, '')
  const found = /^(?:(\d{1,2})(?:\s+|-|$))?(?:(\d{1,2})\/(\d{1,2}))?$/.exec(bare)
  const decimal = /^\d{0,2}\.\d{1,4}$/.test(bare)
  if (text.length > 20 || !(found?.[1] || found?.[2] || decimal)) {
    throw new FieldError(field, `${field} must be a size in inches such as 3/8, got ${text.slice(0, 40)}`)
  }
  const inch = decimal ? Number(bare) : Number(found?.[1] ?? 0) + Number(found?.[2] ?? 0) / Number(found?.[3] ?? 1)
  mustBeWithin(field, inch, 1 / 16, 12)
  return inch
}

/**
 * The size of a part, or null where none was given.
 *
 * @param given the part
 * @param name the part's name in the request, such as `chain`; the fields are `<name>.diameterMm` and `<name>.sizeIn`
 * @param metric the metric field's own name
 * @throws FieldError for both sizes at once, or a diameter outside 1 to 300 mm
 */
export function sizeOf(given: SizeGiven, name: string, metric = 'diameterMm'): Size | null {
  if (given.diameterMm !== undefined && given.sizeIn !== undefined) {
    throw new FieldError(`${name}.sizeIn`, `give ${name}.${metric} or ${name}.sizeIn, not both`)
  }
  if (given.sizeIn !== undefined) {
    const inch = parseInch(given.sizeIn, `${name}.sizeIn`)
    return { mm: inch * IN_M * 1000, inch }
  }
  if (given.diameterMm === undefined) return null
  mustBeWithin(`${name}.${metric}`, given.diameterMm, 1, 300)
  return { mm: given.diameterMm, inch: null }
}

/** The entry of a list of [size, value] for a size, or null where the list does not hold it: no interpolation. */
export function listed(list: readonly (readonly [size: number, value: number])[], size: number | null): number | null {
  return list.find(([key]) => size !== null && Math.abs(key - size) < 1e-9)?.[1] ?? null
}
