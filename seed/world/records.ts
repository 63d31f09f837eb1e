import type { PullRecord } from '../../shared/types/holding'
import type { World } from './types'

/** The world's pulls as the fit takes them; fouled pulls enter nothing and are left out, those that never set have set false. */
export function pullRecords(world: World): PullRecord[] {
  const familyOf = new Map(world.designs.map(d => [d.slug, d.family]))
  const trialOf = new Map(world.trials.map(t => [t.slug, t]))
  const rigOf = new Map(world.rigs.map(r => [r.slug, r]))
  return world.pulls.filter(pull => pull.setting !== 'fouled').map((pull) => {
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
      set: pull.setting !== 'neverSet',
      heldN: pull.heldN,
      movedN: pull.movedN,
      shankAngleDeg: trial.shankAngleDeg,
    }
  })
}
