import type { PullRecord } from '#shared/types/holding'
import type { Family, NumberedSeabed } from '#shared/types/words'

const columns = ['trial', 'rig', 'design', 'family', 'massKg', 'seabed', 'modification', 'heldN', 'movedN', 'shankAngleDeg'] as const

/** Pulls as comma-separated text; an empty field means none. No field holds a comma. */
export function writePulls(pulls: readonly PullRecord[]): string {
  const lines = pulls.map(pull => columns.map(name => pull[name] ?? '').join(','))
  return [columns.join(','), ...lines, ''].join('\n')
}

/** Reads what `writePulls` wrote. */
export function readPulls(text: string): PullRecord[] {
  return text.trim().split('\n').slice(1).map((line) => {
    const [trial, rig, design, family, massKg, seabed, modification, heldN, movedN, angle] = line.split(',') as string[]
    return {
      trial: trial!, design: design!, family: family as Family, massKg: Number(massKg), seabed: seabed as NumberedSeabed, set: true,
      heldN: Number(heldN), movedN: movedN === '' ? null : Number(movedN), shankAngleDeg: Number(angle),
      ...(rig ? { rig } : {}), ...(modification ? { modification } : {}),
    }
  })
}

/** Reads a table that one of the R scripts wrote: a header, then rows, as records of text. */
export function readTable(text: string): Record<string, string>[] {
  const [header, ...lines] = text.trim().split('\n').map(line => line.replaceAll('"', '').split(','))
  return lines.map(line => Object.fromEntries(header!.map((name, i) => [name, line[i]!])))
}
