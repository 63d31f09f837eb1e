import type { boatTypes, chainGrades, exposures, rankingOrders, ropeConstructions, swells, windKinds } from '#shared/types/words'
import { targets } from '#shared/types/words'
import type { QuantityKind } from '#shared/units/systems'

/** The words of a plan: what each is called in the address, on the page and in a request, and what it says at first. */

export interface QuantityWord {
  kind: QuantityKind | 'number'
  label: string
  /** what stands there before the reader types */
  start: string
  optional: boolean
  /** where the value goes in a request, so that a refusal finds its way back to the word */
  path: string
  /** allowed interval, SI */
  min: number
  max: number
}

type Spec = [kind: QuantityKind | 'number', label: string, path: string, min: number, max: number, start?: string, optional?: boolean]

const word = ([kind, label, path, min, max, start = '', optional = true]: Spec): QuantityWord =>
  ({ kind, label, path, min, max, start, optional })

export const quantityWords = {
  length: word(['length', 'Length overall', 'boat.lengthM', 2, 80, '11.2 m', false]),
  displacement: word(['mass', 'Displacement', 'boat.displacementKg', 20, 2e6, '7.4 t']),
  chain: word(['length', 'Chain length', 'rode.chain.lengthM', 0, 2000, '45 m', false]),
  size: word(['diameter', 'Chain size', 'rode.chain.diameterMm', 0.004, 0.1, '10 mm', false]),
  snubber: word(['length', 'Snubber length', 'rode.snubber.lengthM', 0.1, 200, '8 m']),
  depth: word(['length', 'Depth', 'depthM', 0.1, 300, '8 m', false]),
  wind: word(['speed', 'Wind speed', 'wind.speedMs', 0.1, 100, '30 kn', false]),
  anchor: word(['mass', 'Anchor mass to compare at', 'massKg', 0.5, 2000, '20 kg']),
  ownmass: word(['mass', 'Mass of my own anchor', 'own.massKg', 0.5, 2000]),

  beam: word(['length', 'Beam', 'boat.beamM', 0.5, 30]),
  freeboard: word(['length', 'Freeboard', 'boat.freeboardM', 0.1, 12]),
  bow: word(['length', 'Bow height', 'boat.bowHeightM', 0.1, 12]),
  side: word(['area', 'Side area', 'boat.sideAreaM2', 0, 5000]),
  sidecd: word(['number', 'Side drag coefficient', 'boat.sideDragCoefficient', 0, 3]),
  wll: word(['length', 'Waterline length', 'boat.waterline.lengthM', 1, 80]),
  wlb: word(['length', 'Waterline beam', 'boat.waterline.beamM', 0.2, 30]),
  draught: word(['length', 'Draught', 'boat.waterline.draughtM', 0.05, 15]),
  propeller: word(['area', 'Propeller area', 'boat.propellerAreaM2', 0, 20]),

  rope: word(['length', 'Rope length', 'rode.rope.lengthM', 0.1, 2000]),
  ropesize: word(['diameter', 'Rope size', 'rode.rope.diameterMm', 0.004, 0.1]),
  ropebreak: word(['force', 'Rope breaking strength', 'rode.rope.breakingN', 1, 2e7]),
  chainbreak: word(['force', 'Chain breaking strength', 'rode.chain.breakingN', 1, 2e7]),
  snubsize: word(['diameter', 'Snubber size', 'rode.snubber.diameterMm', 0.004, 0.1, '14 mm']),
  snubbreak: word(['force', 'Snubber breaking strength', 'rode.snubber.breakingN', 1, 2e7]),
  shackle: word(['diameter', 'Shackle size', 'shackles.0.sizeMm', 0.004, 0.1]),

  sheer: word(['angle', 'Sheer angle', 'wind.sheerDeg', 0, 1.5708]),
  rise: word(['length', 'Rise of tide to come', 'riseM', 0, 20]),
  fall: word(['length', 'Fall of tide to come', 'fallM', 0, 20]),
  waves: word(['length', 'Wave height', 'waveHeightM', 0, 15]),
  current: word(['speed', 'Current', 'currentMs', 0, 5]),
} as const satisfies Record<string, QuantityWord>

export type QuantityKey = keyof typeof quantityWords
export const quantityKeys = Object.keys(quantityWords) as QuantityKey[]

export interface Choice<T extends string> { label: string, start: T, options: Readonly<Record<T, string>>, path: string }

const choice = <T extends string>(label: string, path: string, start: T, options: Readonly<Record<T, string>>): Choice<T> => ({ label, path, start, options })

/** Address words for the boat types, so that an address reads like a sentence. */
export const choiceWords = {
  type: choice<(typeof boatTypes)[number]>('Type of boat', 'boat.type', 'sailMonohull', { sailMonohull: 'monohull', sailMultihull: 'multihull', motor: 'motor boat' }),
  blow: choice<(typeof windKinds)[number]>('The wind speed is', 'wind.kind', 'gust', { gust: 'gusts', mean: 'mean wind' }),
  exposure: choice<(typeof exposures)[number]>('How gusty', 'wind.exposure', 'offshoreWind', {
    offshoreWind: 'wind off the land', onshoreWind: 'wind off the sea', atSea: 'open sea', inland: 'inland water',
  }),
  forecast: choice<'' | 'yes'>('Forecast', 'wind.at10m', '', { '': 'measured on board', 'yes': 'forecast for 10 m height' }),
  swell: choice<(typeof swells)[number]>('Swell', 'swell', 'none', { none: 'no swell', sheltered: 'a little, sheltered', moderate: 'moderate', open: 'open to it' }),
  grade: choice<'' | (typeof chainGrades)[number]>('Chain grade', 'rode.chain.grade', 'G30', { '': 'not known', 'G30': 'G30', 'G40': 'G40', 'G43': 'G43', 'G70': 'G70' }),
  ropetype: choice<(typeof ropeConstructions)[number]>('Rope construction', 'rode.rope.construction', 'nylon3Strand', { nylon3Strand: 'three-strand nylon', nylonDoubleBraid: 'double-braid nylon' }),
  snubtype: choice<(typeof ropeConstructions)[number]>('Snubber construction', 'rode.snubber.construction', 'nylon3Strand', { nylon3Strand: 'three-strand nylon', nylonDoubleBraid: 'double-braid nylon' }),
  roller: choice<'' | 'yes'>('At the bow', 'overRoller', '', { '': 'fair lead, no hard bend', 'yes': 'over a roller or gypsy' }),
  target: choice<'0.8' | '0.9' | '0.95'>('Chance a size should reach', 'target', '0.9', { 0.8: '80 %', 0.9: '90 %', 0.95: '95 %' }),
  order: choice<(typeof rankingOrders)[number]>('Order', 'order', 'worst', { worst: 'by the worst seabed', weighted: 'by the chance over the mix' }),
} as const

export type ChoiceKey = keyof typeof choiceWords
export const choiceKeys = Object.keys(choiceWords) as ChoiceKey[]

/** Targets stand in the address as they stand in a request. */
export const targetOf = (text: string): (typeof targets)[number] => targets.find(target => String(target) === text) ?? 0.9

/** Words of the main sentence: they stay in the address even when blank. */
export const sentenceKeys: readonly QuantityKey[] = ['length', 'displacement', 'chain', 'size', 'snubber', 'depth', 'wind', 'anchor', 'snubsize']

/** Parts the wind pushes on, and their short names in the address. */
export const windageKeys = {
  hull: 'hull',
  cabin: 'cabin and cockpit structure',
  mast: 'mast and boom',
  stays: 'stays and shrouds',
  sails: 'furled sails and covers',
  gear: 'sprayhood, bimini, dinghy, gear',
} as const

export type WindageKey = keyof typeof windageKeys
export const windageKeyList = Object.keys(windageKeys) as WindageKey[]

/** Most seabeds that one mix may name. */
export const mostSeabeds = 5
