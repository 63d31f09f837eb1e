import { describe, expect, it } from 'vitest'
import { cohesiveNote } from '#shared/holding/cohesive'
import { modificationRatio } from '#shared/holding/ratios'
import { modificationVerdict } from '#shared/holding/modifications'
import type { NumberedSeabed } from '#shared/types/words'

/** A ratio with sd in ln, and the verdict that goes with it; invented. */
function ratio(seabed: NumberedSeabed, median: number, lnSd: number, pairs = 8) {
  const lnRatio = Math.log(median)
  return modificationRatio({ design: 'alder', modification: 'm', seabed, lnRatio, lnSd, pulls: 10, pairs, verdict: pairs === 0 ? null : modificationVerdict(lnRatio, lnSd) })
}

describe('modificationRatio', () => {
  it('gives the interval that the verdict goes by', () => {
    // exp(-/+ 1.6449 x 0.1) about 0.6
    const { ratio: { median, low90, high90 }, verdict } = ratio('firm-mud', 0.6, 0.1)
    expect([median, low90, high90].map(value => value.toFixed(4))).toEqual(['0.6000', '0.5090', '0.7073'])
    expect(verdict).toBe('worse')
  })
})

describe('a note on cohesive and clean seabeds', () => {
  it('says a difference where every interval lies clear of every other', () => {
    const worseInMud = [ratio('firm-mud', 0.6, 0.06), ratio('stiff-clay', 0.55, 0.06), ratio('loose-sand', 1, 0.05)]
    expect(cohesiveNote(worseInMud)).toMatch(/^Against the unmodified anchor it holds less on mud and clay \(pulled on firm mud, stiff clay\) than on sand and gravel \(pulled on loose sand\)/)
    const betterInMud = [ratio('firm-mud', 1.4, 0.06), ratio('gravel', 0.9, 0.06)]
    expect(cohesiveNote(betterInMud)).toMatch(/^Against the unmodified anchor it holds more on mud and clay/)
  })

  it('says that there is none where all carry the same verdict', () => {
    expect(cohesiveNote([ratio('firm-mud', 0.6, 0.1), ratio('loose-sand', 0.62, 0.1)])).toMatch(/^On mud and clay \(.*\) as on sand and gravel \(.*\) it holds less: the pulls show no split/)
    expect(cohesiveNote([ratio('silt', 1, 0.05), ratio('hard-sand', 1.01, 0.05)])).toMatch(/it makes no difference that matters/)
  })

  it('is left unsaid where one interval reaches into the other kind and the verdicts differ', () => {
    expect(cohesiveNote([ratio('firm-mud', 0.6, 0.06), ratio('soft-mud', 0.85, 0.1), ratio('loose-sand', 1, 0.05)])).toBeNull()
    expect(cohesiveNote([ratio('firm-mud', 0.9, 0.2), ratio('loose-sand', 0.95, 0.2)])).toBeNull()
  })

  it('is left unsaid where one kind was not pulled back to back, or is neither', () => {
    expect(cohesiveNote([])).toBeNull()
    expect(cohesiveNote([ratio('firm-mud', 0.6, 0.06), ratio('loose-sand', 1.2, 0.05, 0)])).toBeNull()
    expect(cohesiveNote([ratio('sandy-mud', 0.6, 0.06), ratio('loose-sand', 1.2, 0.05)])).toBeNull()
    expect(cohesiveNote([ratio('weed-over-mud', 0.6, 0.06), ratio('weed-over-sand', 1.2, 0.05), ratio('thin-sand', 1.2, 0.05)])).toBeNull()
  })

  it('does not hang on the order of the ratios', () => {
    const ratios = [ratio('firm-mud', 0.6, 0.06), ratio('loose-sand', 1, 0.05)]
    expect(cohesiveNote([...ratios].reverse())).toBe(cohesiveNote(ratios))
  })
})
