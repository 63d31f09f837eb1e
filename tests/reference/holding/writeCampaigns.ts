import { writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { simulateCampaign } from '../../factories/campaign'
import { writePulls } from './pullsCsv'

/** Writes the simulated pulls that the R scripts and the tests read: `npx tsx tests/reference/holding/writeCampaigns.ts`. */

const write = (name: string, text: string): void => writeFileSync(fileURLToPath(new URL(name, import.meta.url)), text)

/** Free means: steps and limits as a real rig has them, angles too. */
write('freeMeansPulls.csv', writePulls(simulateCampaign({
  seed: 21, designs: 6, families: 4, seabeds: ['firm-mud', 'loose-sand', 'sandy-mud'], trialsPerSeabed: 5, designsPerTrial: 5,
  pullsPerDay: 4, anglesDeg: [0, 3, 8], limitN: 6000,
}).pulls.map(round)))

/** Nearly exact values, no limit, no rig: what a linear mixed model takes. */
write('exactPulls.csv', writePulls(simulateCampaign({
  seed: 22, designs: 12, families: 6, seabeds: ['firm-mud', 'loose-sand', 'sandy-mud', 'gravel'], trialsPerSeabed: 8,
  designsPerTrial: 5, pullsPerDay: 4, step: 1.002, firstN: 1, limitN: Infinity, rigs: 0, massesKg: [10, 20, 35],
}).pulls))

/** The whole model: two rigs, modifications, angles, steps, limits. */
write('wholeModelPulls.csv', writePulls(simulateCampaign({
  seed: 23, designs: 14, families: 7, seabeds: ['firm-mud', 'loose-sand', 'sandy-mud', 'soft-mud', 'gravel'], trialsPerSeabed: 5,
  designsPerTrial: 4, pullsPerDay: 5, modifiedShare: 0.3, rigs: 2, anglesDeg: [0, 0, 5], limitN: 4500, massesKg: [10, 20, 35],
}).pulls.map(round)))

/** Loads to whole newtons, as they would be recorded. */
function round<T extends { heldN: number, movedN: number | null }>(pull: T): T {
  return { ...pull, heldN: Math.round(pull.heldN), movedN: pull.movedN === null ? null : Math.round(pull.movedN) }
}
