import type { Boat, LoadAnswer } from './load'
import type { RuleTableEntry } from './ranking'
import type { RodeAnswer, SnubberAdvice } from './rode'

/** What a ranking starts from: everything of a plan that needs no estimates, besides advice on the snubber. */
export interface PlanGround {
  /** with nothing left out; `guessed` names what the reader did not give */
  boat: Required<Boat> & { guessed: string[] }
  /** seabed to bow that scope, angle and shape go by: depth + rise + half the wave height + bow, m */
  heightM: number
  /** depth at low water, m */
  lowWaterDepthM: number
  /** water under the keel at low water, m; negative where the boat takes the ground */
  clearanceM: number
  /** what the stern can reach round the anchor at low water, m */
  swingRadiusM: number
  /** energy of the surge, J; 0 without swell */
  energyJ: number
  load: LoadAnswer
  /** at the survey total, its strength at the design load; null where the rode cannot bound the load */
  rode: RodeAnswer | null
  /** mass of the rows: asked for, else the own anchor's, else the rule table's; null outside the table */
  massKg: number | null
  ruleTables: RuleTableEntry[]
  cautions: string[]
}

/** Everything of a plan that needs no estimates: worked out alike in the browser and on the server. */
export interface PlanAnswer extends PlanGround {
  /** what a snubber does, or would do, for the rode at the design load and in the surge */
  snubber: SnubberAdvice
}
