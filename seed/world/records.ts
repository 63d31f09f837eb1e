import type { PullRecord } from '../../shared/types/holding'
import type { World } from './types'

/** The world's pulls as the fit takes them, in order of day; fouled ones are handed over too, marked by their setting. */
export function pullRecords(world: World): PullRecord[] {
  const familyOf = new Map(world.designs.map(d => [d.slug, d.family]))
  const trialOf = new Map(world.trials.map(t => [t.slug, t]))
  const rigOf = new Map(world.rigs.map(r => [r.slug, r]))
  return world.pulls.map((pull) => {
    const family = familyOf.get(pull.design)
    const trial = trialOf.get(pull.trial)
    const rig = trial && rigOf.get(trial.rig)
    if (!family || !rig) throw new RangeError(`pull must name a known design and trial, got ${pull.design}, ${pull.trial}`)
    return {
      trial: pull.trial,
      rig: rig.slug,
      calibrationSd: rig.calibrationSd,
      design: pull.design,
      family,
      massKg: pull.massKg,
      seabed: pull.seabed,
      ...(pull.modification === null ? {} : { modification: pull.modification }),
      set: pull.setting === 'set' || pull.setting === 'setAfterDragging',
      heldN: pull.heldN,
      movedN: pull.movedN,
      shankAngleDeg: trial.shankAngleDeg,
      setting: pull.setting,
      ...(pull.end === null ? {} : { end: pull.end }),
      ...(pull.after === null ? {} : { after: pull.after }),
      ...(pull.veerOutcome === null ? {} : { veer: pull.veerOutcome }),
      ...(pull.fresh ? {} : { fresh: false }),
      ...(pull.pair === null ? {} : { pair: pull.pair }),
    }
  })
}
