import type { WorldRig, WorldTrial } from './types'
import type { DayKind, ScheduledDay } from './schedule'
import { places, schedule } from './schedule'
import { randomStream } from './random'

export const soundName = 'Sound of Merrowane'

/** The invented tester: a group, no person. */
export const tester = {
  slug: 'merrowane-ground-tackle-group',
  name: 'Merrowane Ground Tackle Group',
  about: 'An invented club of invented sailors who pull anchors from one invented workboat. Nothing here was measured.',
}

/** The one rig: a workboat that pulls by thrust, in steps, up to 4.5 kN. */
export const rig: WorldRig = {
  slug: 'teasel-margin',
  name: 'Thrust table of Teasel Margin',
  vessel: 'Teasel Margin',
  limitN: 4500,
  thrustStepsN: [200, 400, 600, 800, 1000, 1250, 1500, 1750, 2000, 2300, 2600, 3000, 3500, 4000, 4500],
  holdTimeS: 30,
  calibrationDate: '2024-04-02',
  calibrationMethod: 'Bollard pull against a load cell at every step, both tides, mean of six runs',
  calibrationSd: 0.04,
}

/** Middle of the invented sound: open ocean, no land there. */
const middle = { latitudeDeg: 48.61, longitudeDeg: -23.4 }
const bowHeightM = 1.4
const chainMm = 10
/** submerged weight of 10 mm chain: 2.20 kg/m (DIN 766, memory) x 0.869 x g */
const chainWeightNPerM = 2.20 * 0.869 * 9.80665

const procedures: Readonly<Record<DayKind, string>> = {
  designs: 'Each design in turn, order shuffled each round. Dropped with way off, set at idle astern, then the thrust table upward, 30 s a step.',
  pairs: 'Modified and unmodified anchor back to back within 50 m, taking turns to go first. Then the thrust table upward, 30 s a step.',
  masses: 'Five designs at 10, 20 and 35 kg, order shuffled. Set at idle astern, then the thrust table upward, 30 s a step.',
}

/** Shank angle in degrees under a horizontal load (N), all-chain rode of lengthM to a bow heightM above a flat bottom. */
export function shankAngleDeg(lengthM: number, heightM: number, loadN: number): number {
  const a = loadN / chainWeightNPerM
  if (lengthM >= Math.sqrt(heightM * heightM + 2 * heightM * a)) return 0
  const span = 2 * a * Math.asinh(Math.sqrt(lengthM * lengthM - heightM * heightM) / (2 * a))
  const verticalN = chainWeightNPerM / 2 * (heightM / Math.tanh(span / (2 * a)) - lengthM)
  return Math.round(Math.atan(verticalN / loadN) * 1800 / Math.PI) / 10
}

function conditions(slug: string, seed: string) {
  const random = randomStream(`${seed}/conditions/${slug}`)
  const windMs = Math.round((2 + 6 * random.uniform()) * 2) / 2
  const waveHeightM = Math.round(Math.max(0, windMs - 3) * 0.6) / 10
  return {
    windMs,
    windFrom: random.pick(['W', 'SW', 'NW', 'S', 'N', 'E', 'NE', 'SE']),
    currentMs: random.pick([0, 0, 0.1, 0.1, 0.2, 0.3]),
    waveHeightM,
    seaState: waveHeightM === 0 ? 'calm' : waveHeightM <= 0.1 ? 'rippled' : 'smooth',
  }
}

/** One scheduled day as a trial. */
function trialOf([day, seabed, kind, depthM, chainLengthM]: ScheduledDay, seed: string): WorldTrial {
  const place = places[seabed]
  const slug = `${place.name.toLowerCase().replaceAll(' ', '-')}-${day}`
  const angle = shankAngleDeg(chainLengthM, depthM + bowHeightM, rig.limitN)
  return {
    slug,
    day,
    season: Number(day.slice(0, 4)),
    sound: soundName,
    place: place.name,
    latitudeDeg: Math.round(middle.latitudeDeg * 100 + place.north) / 100,
    longitudeDeg: Math.round(middle.longitudeDeg * 100 + place.east) / 100,
    tester: tester.name,
    rig: rig.slug,
    seabed,
    procedure: procedures[kind],
    ...conditions(slug, seed),
    depthM,
    bowHeightM,
    chainMm,
    chainLengthM,
    shankAngleDeg: angle,
    note: angle > 0 ? 'Less chain out than usual: it left the bottom at the top steps.' : 'Chain stayed on the bottom to the last step.',
  }
}

/** The forty trials in order of day, with the day's purpose beside each. */
export function makeTrials(seed: string): { trial: WorldTrial, kind: DayKind }[] {
  return schedule.map(row => ({ trial: trialOf(row, seed), kind: row[2] }))
}
