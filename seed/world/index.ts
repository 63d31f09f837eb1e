import type { World, WorldDesign, WorldPull } from './types'
import type { PlannedPull } from './plan'
import { designs } from './designs'
import { families, seabeds } from './lists'
import { planDay } from './plan'
import { randomStream } from './random'
import { simulatePull } from './simulate'
import { sizes } from './sizes'
import { makeTrials, rig, soundName, tester } from './trials'
import { modifications } from './truth/modifications'

export { truth } from './truth'
export { pullRecords } from './records'
export type * from './types'

/** The seed of the demo world as everybody gets it. */
export const worldSeed = 'merrowane-1'
const continueChance = 0.5

function designOf(slug: string): WorldDesign {
  const design = designs.find(d => d.slug === slug)
  if (!design) throw new RangeError(`design must be one of the demo world's, got ${slug}`)
  return design
}

/** One day's pulls in order; now and then an anchor that broke out and reset is pulled again where it lies. */
function pullDay(trial: World['trials'][number], plans: readonly PlannedPull[], seed: string): WorldPull[] {
  const pulls: WorldPull[] = []
  for (const plan of plans) {
    const design = designOf(plan.design)
    const pull = simulatePull(trial, plan, design, pulls.length + 1, true, seed)
    pulls.push(pull)
    const goesOn = plan.mayContinue && pull.after === 'reset'
      && randomStream(`${seed}/again/${trial.slug}/${pull.order}`).chance(continueChance)
    if (goesOn) pulls.push(simulatePull(trial, plan, design, pulls.length + 1, false, seed))
  }
  return pulls
}

/**
 * The invented demo world: plain data, no clock, no database. The same seed gives the same bytes.
 *
 * @param seed any text; another seed gives another campaign from the same true values
 */
export function makeWorld(seed: string = worldSeed): World {
  const days = makeTrials(seed)
  const pulls = days.flatMap(({ trial, kind }, at) => {
    const earlier = days.slice(0, at).filter(day => day.kind === 'designs' && day.trial.seabed === trial.seabed).length
    return pullDay(trial, planDay(trial, kind, earlier, seed), seed)
  })
  return {
    seed,
    sound: soundName,
    tester: { ...tester },
    seabeds: seabeds.map(s => ({ ...s })),
    families: families.map(f => ({ ...f })),
    designs: designs.map(d => ({ ...d, settings: [...d.settings] })),
    sizes: sizes.map(s => ({ ...s })),
    modifications: modifications.map(m => ({ ...m })),
    rigs: [{ ...rig, thrustStepsN: [...rig.thrustStepsN] }],
    trials: days.map(day => day.trial),
    pulls,
  }
}
