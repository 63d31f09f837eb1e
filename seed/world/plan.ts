import type { WorldTrial } from './types'
import type { DayKind } from './schedule'
import type { PulledSeabed } from './truth/holding'
import type { RandomStream } from './random'
import { coverage, massDesigns, massPulls, pairsPerDay } from './schedule'
import { designs } from './designs'
import { testMassKg } from './sizes'
import { modifications } from './truth/modifications'
import { randomStream } from './random'

/** A pull that a day sets out to make, before anything is known of how it goes. */
export interface PlannedPull {
  design: string
  massKg: number
  modification: string | null
  pair: string | null
  /** first pull of this design on its day, on a day without pairs */
  firstOfDay: boolean
  /** to be stopped part way and turned under load, if it holds that long */
  veer: boolean
  /** a further pull may follow a breakout without lifting the anchor */
  mayContinue: boolean
  eastM: number
  northM: number
}

const veerChance = 0.6
const notVeered: readonly PulledSeabed[] = ['soft-mud', 'cobble-over-sand', 'weed-over-sand']

function spot(random: RandomStream, reachM: number) {
  const offset = () => Math.round((2 * random.uniform() - 1) * reachM)
  return { eastM: offset(), northM: offset() }
}

/** The designs of a side-by-side day, the dayIndex-th (from 0) on its seabed. */
function designsOfDay(seabed: PulledSeabed, dayIndex: number): { design: string, pulls: number }[] {
  const { never, thin, pulls, restOne } = coverage[seabed]
  const always = designs.filter(d => !never.includes(d.slug) && !thin.includes(d.slug))
  const today = always.filter((_, i) => !restOne || i % 4 !== dayIndex % 4)
  const rare = dayIndex === 0 ? thin.map(design => ({ design, pulls: 2 })) : []
  return [...today.map(d => ({ design: d.slug, pulls })), ...rare]
}

function planDesigns(seabed: PulledSeabed, dayIndex: number, random: RandomStream): PlannedPull[] {
  const today = designsOfDay(seabed, dayIndex)
  const rounds = Math.max(...today.map(d => d.pulls))
  const veers = !notVeered.includes(seabed)
  return Array.from({ length: rounds }, (_, round) =>
    random.shuffle(today.filter(d => d.pulls > round)).map(({ design, pulls }) => ({
      design,
      massKg: testMassKg(design),
      modification: null,
      pair: null,
      firstOfDay: round === 0,
      veer: veers && round === pulls - 1 && random.chance(veerChance),
      mayContinue: true,
      ...spot(random, 420),
    }))).flat()
}

function planMasses(random: RandomStream): PlannedPull[] {
  const rounds = Math.max(...massPulls.map(([, pulls]) => pulls))
  const seen = new Set<string>()
  return Array.from({ length: rounds }, (_, round) => {
    const today = massPulls.filter(([, pulls]) => pulls > round)
    return random.shuffle(massDesigns.flatMap(design => today.map(([massKg]) => ({ design, massKg }))))
  }).flat().map(({ design, massKg }) => {
    const key = `${design}/${massKg}`
    const firstOfDay = !seen.has(key)
    seen.add(key)
    return { design, massKg, modification: null, pair: null, firstOfDay, veer: false, mayContinue: false, ...spot(random, 420) }
  })
}

function planPairs(trial: string, random: RandomStream): PlannedPull[] {
  const turns = Array.from({ length: pairsPerDay }, (_, turn) => random.shuffle(modifications).map(m => ({ turn, ...m }))).flat()
  return turns.flatMap(({ turn, slug, design }) => {
    const place = spot(random, 400)
    const both = turn % 2 === 0 ? [null, slug] : [slug, null]
    return both.map(modification => ({
      design,
      massKg: testMassKg(design),
      modification,
      pair: `${trial}/${slug}/${turn + 1}`,
      firstOfDay: false,
      veer: false,
      mayContinue: false,
      eastM: place.eastM + Math.round(30 * (random.uniform() - 0.5)),
      northM: place.northM + Math.round(30 * (random.uniform() - 0.5)),
    }))
  })
}

/** What a trial's day sets out to do. dayIndex counts the earlier side-by-side days on the same seabed. */
export function planDay(trial: WorldTrial, kind: DayKind, dayIndex: number, seed: string): PlannedPull[] {
  const random = randomStream(`${seed}/plan/${trial.slug}`)
  if (kind === 'pairs') return planPairs(trial.slug, random)
  if (kind === 'masses') return planMasses(random)
  return planDesigns(trial.seabed as PulledSeabed, dayIndex, random)
}
