import { cellEffects, exponentEffect, modificationEffects, referenceMassKg } from '#shared/holding/effects'
import type { Cell, Effect } from '#shared/holding/effects'
import { sdPriorScale } from '#shared/holding/holdingModel'
import type { HoldingModel } from '#shared/holding/holdingModel'
import type { Contrast, UnseenEffect } from '#shared/stats/contrasts'
import type { NumberedSeabed } from '#shared/types/words'

/** Turns cells into contrasts of one model's effects; effects that no pull carries keep one number each throughout. */
export interface ContrastMaker {
  cell: (cell: Cell) => Contrast
  exponent: (seabed: NumberedSeabed) => Contrast
  modification: (design: string, modification: string, seabed: NumberedSeabed) => Contrast
}

/**
 * Makes contrasts for a model. An effect of a kind that no fitted pull carries (a modification that never set) has the prior's
 * root mean square sd.
 */
export function contrastMaker(model: HoldingModel): ContrastMaker {
  const unseenIds = new Map<string, number>()
  const of = (effects: readonly Effect[]): Contrast => {
    const cols: number[] = []
    const unseen: UnseenEffect[] = []
    for (const { key, kind } of effects) {
      const col = model.columnOf.get(key)
      if (col !== undefined) {
        cols.push(col)
        continue
      }
      const group = model.groups.findIndex(name => name === kind)
      if (!unseenIds.has(key)) unseenIds.set(key, unseenIds.size)
      unseen.push({ id: unseenIds.get(key)!, group, knownSd: sdPriorScale })
    }
    return { cols, unseen }
  }
  return {
    cell: cell => of(cellEffects(cell)),
    exponent: seabed => of([exponentEffect(seabed, referenceMassKg)]),
    modification: (design, modification, seabed) => of(modificationEffects(design, modification, seabed)),
  }
}
