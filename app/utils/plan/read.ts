import type { Boat, WindagePart } from '#shared/types/load'
import type { RankingRequest } from '#shared/types/ranking'
import type { Rode, Shackle } from '#shared/types/rode'
import type { BoatType, ChainGrade, Exposure, RankingOrder, RopeConstruction, Swell, WindKind } from '#shared/types/words'
import type { UnitSystem } from '#shared/units/systems'
import { DEG_RAD } from '#shared/units/constants'
import { completeBoat } from '#shared/load/boat'
import type { CompleteBoat } from '#shared/load/boat'
import { readQuantity } from '~/utils/plan/quantity'
import type { Reading } from '~/utils/plan/quantity'
import { readMix } from '~/utils/plan/shares'
import type { TypedPlan } from '~/utils/plan/typed'
import { quantityKeys, quantityWords, targetOf, windageKeyList, windageKeys } from '~/utils/plan/words'
import type { QuantityKey } from '~/utils/plan/words'

/** What is wrong with a word: the id of its control without the prefix, and a sentence. */
export interface Issue { key: string, message: string }

export interface Strongpoints { shackles?: Shackle[], overRoller?: boolean }

/** A typed plan as understood: a request where nothing is wrong, and what every word was read as. */
export interface PlanReading {
  request: RankingRequest | null
  strongpoints: Strongpoints
  boat: CompleteBoat | null
  readings: Record<QuantityKey, Reading>
  issues: Issue[]
}

/** Sets a key only where there is a value: the API refuses what it does not know, and `undefined` is nothing. */
const given = <K extends string, V>(key: K, value: V | undefined): Partial<Record<K, V>> =>
  value === undefined ? {} : { [key]: value } as Record<K, V>

function readBoat(plan: TypedPlan, value: (key: QuantityKey) => number | undefined, system: UnitSystem, issues: Issue[]): CompleteBoat | null {
  const lengthM = value('length')
  if (lengthM === undefined) return null
  const base: Omit<Boat, 'beamM'> & { beamM?: number } = {
    type: plan.choices.type as BoatType, lengthM,
    ...given('beamM', value('beam')), ...given('displacementKg', value('displacement')),
    ...given('freeboardM', value('freeboard')), ...given('bowHeightM', value('bow')),
    ...given('sideAreaM2', value('side')), ...given('sideDragCoefficient', value('sidecd')),
    ...given('propellerAreaM2', value('propeller')),
  }
  const complete = completeBoat(base)
  const waterline = { lengthM: value('wll'), beamM: value('wlb'), draughtM: value('draught') }
  const windage = readWindage(plan, complete.windage, system, issues)
  return completeBoat({
    ...base,
    ...given('windage', windage),
    ...(Object.values(waterline).every(one => one === undefined)
      ? {}
      : { waterline: {
          lengthM: waterline.lengthM ?? complete.waterline.lengthM,
          beamM: waterline.beamM ?? complete.waterline.beamM,
          draughtM: waterline.draughtM ?? complete.waterline.draughtM,
        } }),
  })
}

/** Windage given replaces all default parts, so one part typed sends them all. */
function readWindage(plan: TypedPlan, defaults: readonly WindagePart[], system: UnitSystem, issues: Issue[]): WindagePart[] | undefined {
  let typed = false
  const parts = windageKeyList.map((key) => {
    const part = windageKeys[key]
    const standing = defaults.find(other => other.part === part) ?? { part, areaM2: 0, dragCoefficient: 1 }
    const area = readQuantity(plan.areas[key], 'area', system, 0, 5000)
    const drag = readQuantity(plan.drags[key], 'number', system, 0, 3)
    if (area.state === 'refused') issues.push({ key, message: area.error })
    if (drag.state === 'refused') issues.push({ key: `${key}cd`, message: drag.error })
    if (area.state === 'read' || drag.state === 'read') typed = true
    return {
      part,
      areaM2: area.state === 'read' ? area.value : standing.areaM2,
      dragCoefficient: drag.state === 'read' ? drag.value : standing.dragCoefficient,
    }
  })
  return typed ? parts : undefined
}

/** A size as typed: an inch fraction keeps its name, since inch lists are read by it; anything else is millimetres. */
function sizeOf(reading: Reading): { sizeIn: string } | { diameterMm: number } | undefined {
  if (reading.state !== 'read') return undefined
  return reading.sizeIn === undefined ? { diameterMm: Math.round(reading.value * 1e6) / 1000 } : { sizeIn: reading.sizeIn }
}

function readRode(plan: TypedPlan, readings: PlanReading['readings'], value: (key: QuantityKey) => number | undefined, issues: Issue[]): Rode {
  const [rope, snubber] = [value('rope'), value('snubber')]
  const grade = plan.choices.grade as ChainGrade | ''
  const chainM = value('chain') ?? 0
  if (rope !== undefined && readings.ropesize.state === 'blank') issues.push({ key: 'ropesize', message: 'Say how thick the rope is: its weight and its stretch come from that.' })
  if (chainM === 0 && rope === undefined && readings.chain.state === 'read') issues.push({ key: 'chain', message: 'Give some chain, or rope under “More about the rode”.' })
  return {
    chain: { lengthM: chainM, ...sizeOf(readings.size), ...given('grade', grade === '' ? undefined : grade), ...given('breakingN', value('chainbreak')) },
    ...(rope === undefined ? {} : { rope: { lengthM: rope, ...sizeOf(readings.ropesize), construction: plan.choices.ropetype as RopeConstruction, ...given('breakingN', value('ropebreak')) } }),
    ...(snubber === undefined ? {} : { snubber: { lengthM: snubber, ...sizeOf(readings.snubsize), construction: plan.choices.snubtype as RopeConstruction, ...given('breakingN', value('snubbreak')) } }),
  }
}

function readStrongpoints(plan: TypedPlan, readings: PlanReading['readings']): Strongpoints {
  const size = sizeOf(readings.shackle)
  const shackle: Shackle | undefined = size && ('sizeIn' in size ? size : { sizeMm: size.diameterMm })
  return { ...given('shackles', shackle && [shackle]), ...given('overRoller', plan.choices.roller === 'yes' ? true : undefined) }
}

/**
 * Reads a typed plan.
 *
 * @param plan as typed
 * @param system units that a bare number is read in
 */
export function readPlan(plan: TypedPlan, system: UnitSystem): PlanReading {
  const issues: Issue[] = []
  const readings = Object.fromEntries(quantityKeys.map((key) => {
    const { kind, min, max, optional, label } = quantityWords[key]
    const reading = readQuantity(plan.words[key], kind, system, min, max)
    if (reading.state === 'refused') issues.push({ key, message: reading.error })
    if (reading.state === 'blank' && !optional) issues.push({ key, message: `${label} is needed.` })
    return [key, reading]
  })) as PlanReading['readings']
  const value = (key: QuantityKey): number | undefined => {
    const reading = readings[key]
    return reading.state === 'read' ? reading.value : undefined
  }
  const boat = readBoat(plan, value, system, issues)
  const rode = readRode(plan, readings, value, issues)
  const { mix, errors } = readMix(plan.beds, system)
  for (const { row, message } of errors) issues.push({ key: `bed${row ?? 0}`, message })
  if (plan.own && value('ownmass') === undefined && readings.ownmass.state === 'blank') {
    issues.push({ key: 'ownmass', message: 'Say how heavy your own anchor is, so that it can be judged.' })
  }
  const strongpoints = readStrongpoints(plan, readings)
  const [windMs, depthM] = [value('wind'), value('depth')]
  if (issues.length > 0 || !boat || windMs === undefined || depthM === undefined) return { request: null, strongpoints, boat, readings, issues }
  const { guessed, ...whole } = boat
  const kept = Object.fromEntries(Object.entries(whole).filter(([name]) => name === 'beamM' || !guessed.includes(name))) as unknown as Boat
  const sheer = value('sheer')
  const ownKg = value('ownmass')
  return {
    boat, readings, issues, strongpoints,
    request: {
      boat: kept,
      wind: {
        speedMs: windMs, kind: beaufortTyped(readings.wind) ? 'mean' : plan.choices.blow as WindKind, exposure: plan.choices.exposure as Exposure,
        ...given('at10m', plan.choices.forecast === 'yes' || beaufortTyped(readings.wind) ? true : undefined),
        ...given('sheerDeg', sheer === undefined ? undefined : sheer / DEG_RAD),
      },
      ...given('currentMs', value('current')), swell: plan.choices.swell as Swell,
      rode, depthM,
      ...given('riseM', value('rise')), ...given('fallM', value('fall')), ...given('waveHeightM', value('waves')),
      seabeds: mix,
      ...given('massKg', value('anchor')),
      ...(plan.own && ownKg !== undefined ? { own: { design: plan.own, massKg: ownKg } } : {}),
      target: targetOf(plan.choices.target), order: plan.choices.order as RankingOrder,
    },
  }
}

/** A Beaufort force is a mean at 10 m by its definition. */
const beaufortTyped = (reading: Reading): boolean => reading.state === 'read' && reading.beaufort !== undefined
