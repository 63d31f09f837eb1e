import { fileURLToPath } from 'node:url'
import { fitHolding } from '#shared/holding/fitHolding'
import { countEffects } from '#shared/holding/readRequest'
import { numberedSeabeds } from '#shared/types/words'
import { simulateCampaign } from '../factories/campaign'
import type { CampaignPlan } from '../factories/campaign'

/** One line of the benchmark: what was fitted, and the processor and wall time it took. */
export interface FitBenchRow { pulls: number, effects: number, anchorDays: number, cpuMs: number, wallMs: number }

const plan = (trialsPerSeabed: number, seabeds: number, designs: number): CampaignPlan => ({
  seed: 5, designs, families: 9, seabeds: numberedSeabeds.slice(0, seabeds), trialsPerSeabed, designsPerTrial: 6, pullsPerDay: 3,
  modifiedShare: 0.15, massesKg: [10, 20, 35],
})

/** About 650, 2 000 and 5 000 pulls, up to about 1 000 effects. */
const plans: readonly (readonly [pulls: number, plan: CampaignPlan])[] = [
  [650, plan(5, 8, 16)], [2000, plan(9, 13, 24)], [5000, plan(22, 13, 30)],
]

/** Times one fit at each size, in this thread. */
export function benchFit(): FitBenchRow[] {
  return plans.map(([count, of]) => {
    const pulls = simulateCampaign(of).pulls.slice(0, count)
    const cpu = process.cpuUsage()
    const wall = performance.now()
    fitHolding(pulls)
    const used = process.cpuUsage(cpu)
    return {
      pulls: pulls.length,
      effects: countEffects(pulls),
      anchorDays: new Set(pulls.map(pull => `${pull.trial} ${pull.design}`)).size,
      cpuMs: Math.round((used.user + used.system) / 1000),
      wallMs: Math.round(performance.now() - wall),
    }
  })
}

/** Prints the table, for `npm run bench`. */
export async function printFitBench(): Promise<void> {
  console.table(benchFit())
}

if (process.argv[1] === fileURLToPath(import.meta.url)) await printFitBench()
