import type { SeabedShare } from '#shared/types/ranking'
import type { Seabed } from '#shared/types/words'
import type { UnitSystem } from '#shared/units/systems'
import { seabedFacts } from '#shared/seabed/seabeds'
import type { TypedBed } from '~/utils/plan/typed'
import { readQuantity } from '~/utils/plan/quantity'

/** The mix as read, or what is wrong with it, and which row it is about. */
export interface MixReading { mix: SeabedShare[], errors: { row: number | null, message: string }[] }

const tolerance = 0.01

/**
 * Reads the mix of seabeds. Shares left blank split what the others leave; all blank, they are equal.
 *
 * @param beds rows in the reader's order; a row without a seabed says nothing
 */
export function readMix(beds: readonly TypedBed[], system: UnitSystem): MixReading {
  const rows = beds.map((bed, row) => ({ ...bed, row })).filter((bed): bed is { seabed: Seabed, share: string, row: number } => bed.seabed !== '')
  if (rows.length === 0) return { mix: [], errors: [{ row: null, message: 'Name at least one seabed.' }] }
  const errors: MixReading['errors'] = []
  const shares = rows.map(({ seabed, share, row }) => {
    if (rows.some(other => other.row < row && other.seabed === seabed)) {
      errors.push({ row, message: `${seabedFacts(seabed).name} stands twice: give it one share.` })
    }
    const read = readQuantity(share, 'share', system, 0.001, 1)
    if (read.state === 'refused') errors.push({ row, message: read.error })
    return read.state === 'read' ? read.value : null
  })
  const given = shares.reduce((sum: number, share) => sum + (share ?? 0), 0)
  const blanks = shares.filter(share => share === null).length
  if (errors.length === 0 && (blanks === 0 ? Math.abs(given - 1) > tolerance : given > 1 - 0.001 * blanks)) {
    errors.push({ row: rows[0]?.row ?? null, message: `The shares come to ${Math.round(given * 100)} %${blanks > 0 ? ' and leave nothing for the rest' : ''}: make them add up to 100 %.` })
  }
  return { mix: rows.map(({ seabed }, index) => ({ seabed, share: shares[index] ?? (1 - given) / blanks })), errors }
}
