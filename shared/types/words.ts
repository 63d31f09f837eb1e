/** The product's closed lists: one source for schemas, database checks, forms and pages. */

export const boatTypes = ['sailMonohull', 'sailMultihull', 'motor'] as const
export type BoatType = (typeof boatTypes)[number]

export const windKinds = ['mean', 'gust'] as const
export type WindKind = (typeof windKinds)[number]

export const exposures = ['atSea', 'onshoreWind', 'offshoreWind', 'inland'] as const
export type Exposure = (typeof exposures)[number]

export const swells = ['none', 'sheltered', 'moderate', 'open'] as const
export type Swell = (typeof swells)[number]

export const chainGrades = ['G30', 'G40', 'G43', 'G70'] as const
export type ChainGrade = (typeof chainGrades)[number]

export const ropeConstructions = ['nylon3Strand', 'nylonDoubleBraid'] as const
export type RopeConstruction = (typeof ropeConstructions)[number]

/** Seabeds that can carry a holding figure. */
export const numberedSeabeds = [
  'soft-mud', 'silt', 'firm-mud', 'stiff-clay', 'sandy-mud', 'loose-sand', 'hard-sand', 'thin-sand',
  'gravel', 'cobble-over-sand', 'shell', 'weed-over-sand', 'weed-over-mud',
] as const
export type NumberedSeabed = (typeof numberedSeabeds)[number]

/** Seabeds that never carry a number: they are named with a caution. */
export const unnumberedSeabeds = ['thick-weed', 'seagrass', 'rock', 'coral'] as const
export type UnnumberedSeabed = (typeof unnumberedSeabeds)[number]

export const seabeds = [...numberedSeabeds, ...unnumberedSeabeds] as const
export type Seabed = (typeof seabeds)[number]

export const soilKinds = ['soft', 'mixed', 'hard', 'none'] as const
export type SoilKind = (typeof soilKinds)[number]

export const families = [
  'hinged-plough', 'fixed-plough', 'claw', 'pivoting-fluke', 'light-alloy-pivoting-fluke', 'roll-bar-scoop',
  'weighted-tip-scoop', 'plain-scoop', 'fisherman', 'stockless', 'grapnel', 'other',
] as const
export type Family = (typeof families)[number]

export const settingOutcomes = ['set', 'setAfterDragging', 'neverSet', 'fouled'] as const
export type SettingOutcome = (typeof settingOutcomes)[number]

export const pullEnds = ['atTheLimit', 'stoppedEarly', 'crept', 'dragged', 'brokeOut'] as const
export type PullEnd = (typeof pullEnds)[number]

export const pullAfters = ['reset', 'didNotReset', 'notTried'] as const
export type PullAfter = (typeof pullAfters)[number]

export const veerOutcomes = ['stayedBuried', 'brokeOutAndReset', 'brokeOutAndDidNotReset'] as const
export type VeerOutcome = (typeof veerOutcomes)[number]

export const attitudes = ['upright', 'onItsSide', 'inverted', 'buried', 'notSeen'] as const
export type Attitude = (typeof attitudes)[number]

export const foulings = ['clean', 'mudBall', 'clayFilled', 'weed', 'shell', 'stoneJammed', 'ownChain'] as const
export type Fouling = (typeof foulings)[number]

export const conditions = ['undamaged', 'bent'] as const
export type Condition = (typeof conditions)[number]

export const targets = [0.8, 0.9, 0.95] as const
export type Target = (typeof targets)[number]

export const rankingOrders = ['worst', 'weighted'] as const
export type RankingOrder = (typeof rankingOrders)[number]
