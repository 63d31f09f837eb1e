import { endedAtLimit, heldInterval } from '#shared/trial/observation'
import type { PullRecord } from '#shared/types/holding'
import type { Cell } from '#shared/holding/effects'

/** Pulls on record of one design, perhaps modified, on one seabed. */
export interface CellPulls { cell: Cell, pulls: PullRecord[] }

/** Text that names a cell, and orders it: design, seabed, then unmodified before modified. */
export function cellKey(design: string, seabed: string, modification: string | null): string {
  return JSON.stringify([design, seabed, modification ?? ''])
}

/** Splits pulls (in canonical order) into cells, in order of design, seabed and modification. */
export function splitIntoCells(pulls: readonly PullRecord[]): Map<string, CellPulls> {
  const cells = new Map<string, CellPulls>()
  for (const pull of pulls) {
    const modification = pull.modification ?? null
    const key = cellKey(pull.design, pull.seabed, modification)
    const known = cells.get(key)
    if (known) known.pulls.push(pull)
    else cells.set(key, { cell: { design: pull.design, family: pull.family, seabed: pull.seabed, modification }, pulls: [pull] })
  }
  return new Map([...cells].sort(([a], [b]) => (a < b ? -1 : 1)))
}

/** How many pulls entered the fit, on how many days, and how many of them ended at the limit. */
export function evidenceCounts(pulls: readonly PullRecord[]): { pulls: number, days: number, atLimit: number } {
  const fitted = pulls.filter(pull => heldInterval(pull) !== null)
  return {
    pulls: fitted.length,
    days: new Set(fitted.map(pull => pull.trial)).size,
    atLimit: fitted.filter(endedAtLimit).length,
  }
}
