import type { Attitude, Condition, Family, Fouling, PullEnd, SettingOutcome } from '../../shared/types/words'
import type { PulledSeabed } from './truth/holding'
import type { RandomStream } from './random'

/** How a pull went, as far as its looks and notes depend on it. */
export interface Outcome { family: Family, seabed: PulledSeabed, setting: SettingOutcome, end: PullEnd | null, heldN: number }

const unseen: readonly PulledSeabed[] = ['soft-mud', 'firm-mud', 'stiff-clay', 'sandy-mud']

/** What the camera saw at the end: in mud mostly nothing. */
export function attitudeOf({ seabed, setting, end, family }: Outcome, random: RandomStream): Attitude {
  if (random.chance(unseen.includes(seabed) ? 0.7 : 0.2)) return 'notSeen'
  if (setting === 'neverSet' || setting === 'fouled') {
    return random.pick<Attitude>(family === 'claw' ? ['upright', 'upright', 'onItsSide'] : ['onItsSide', 'onItsSide', 'inverted', 'upright'])
  }
  if (end === 'brokeOut') return random.pick<Attitude>(['onItsSide', 'upright', 'inverted'])
  if (end === 'dragged') return random.pick<Attitude>(['upright', 'upright', 'onItsSide', 'buried'])
  return random.pick<Attitude>(['buried', 'buried', 'upright'])
}

const fouledShares: Readonly<Record<PulledSeabed, readonly (readonly [Fouling, number])[]>> = {
  'soft-mud': [['mudBall', 0.25]],
  'firm-mud': [['mudBall', 0.3]],
  'stiff-clay': [['clayFilled', 0.45]],
  'sandy-mud': [['mudBall', 0.12], ['shell', 0.04]],
  'loose-sand': [['shell', 0.03], ['weed', 0.02]],
  'hard-sand': [['shell', 0.04], ['weed', 0.03]],
  'gravel': [['stoneJammed', 0.12], ['shell', 0.06]],
  'cobble-over-sand': [['stoneJammed', 0.2]],
  'weed-over-sand': [['weed', 0.7]],
}

/** What came up on the anchor. */
export function foulingOf({ seabed, setting }: Outcome, random: RandomStream): Fouling {
  if (seabed === 'weed-over-sand' && setting === 'neverSet') return 'weed'
  if (setting === 'fouled') return random.pick<Fouling>(seabed === 'weed-over-sand' ? ['weed', 'ownChain'] : ['ownChain', 'stoneJammed'])
  let left = random.uniform()
  for (const [fouling, share] of fouledShares[seabed]) {
    left -= share
    if (left < 0) return fouling
  }
  return 'clean'
}

const hardGround: readonly PulledSeabed[] = ['hard-sand', 'gravel', 'stiff-clay']

/** Whether it came up bent: light steel pivoting flukes on hard ground, now and then. */
export function conditionOf({ seabed, family, heldN }: Outcome, random: RandomStream): Condition {
  const weak = family === 'pivoting-fluke' || family === 'light-alloy-pivoting-fluke'
  const chance = weak && hardGround.includes(seabed) && heldN >= 2600 ? 0.12 : 0.001
  return random.chance(chance) ? 'bent' : 'undamaged'
}

const never: Partial<Record<PulledSeabed, readonly string[]>> = {
  'weed-over-sand': ['Rolled a raft of weed and never touched the sand.', 'Weed on the point from the first metre.', 'Skated over the weed.'],
  'hard-sand': ['Point scratched along the crust.', 'Lay on its side and skidded.', 'Tip went in twice and lifted twice.'],
  'cobble-over-sand': ['Clattered over the stones.', 'Point rode up on every stone.'],
}
const ends: Readonly<Record<PullEnd, readonly string[]>> = {
  atTheLimit: ['Rig at its limit; anchor did not stir.', 'Had to be broken out with the windlass.'],
  stoppedEarly: ['Stopped to turn it under load.'],
  crept: ['Slow steady creep, load never fell.', 'Kept burying while it crept.'],
  dragged: ['Ploughed a furrow at a steady load.', 'Moved off evenly, load stayed up.'],
  brokeOut: ['Let go all at once.', 'Came out with a clod on the fluke.'],
}

/** A tester's remark, on about a third of the pulls. */
export function noteOf({ seabed, setting, end }: Outcome, condition: Condition, random: RandomStream): string | null {
  if (condition === 'bent') return 'Came up bent; replaced by another of the same size.'
  if (setting === 'fouled') return 'Fouled; lifted and not counted.'
  if (!random.chance(0.35)) return null
  if (setting === 'neverSet') return random.pick(never[seabed] ?? ['Would not go in.'])
  return end === null ? null : random.pick(ends[end])
}
