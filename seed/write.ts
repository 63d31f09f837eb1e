// Writes the demo world into a database, in one transaction.
import type { Transaction } from '../server/db/client'
import { designs, families, modifications, pulls, rigs, seabeds, sizes, trials } from '../server/db/schema'
import { seabedFacts } from '../shared/seabed/seabeds'
import type { World } from './world/types'

function idsBySlug(rows: { id: number, slug: string }[]) {
  const ids = new Map(rows.map(row => [row.slug, row.id]))
  return (slug: string) => {
    const id = ids.get(slug)
    if (id === undefined) throw new Error(`the demo world names ${slug} without describing it`)
    return id
  }
}

async function writeCatalogue(tx: Transaction, world: World) {
  await tx.insert(seabeds).values(world.seabeds.map(({ slug, soil, numbered }) =>
    ({ slug, soil, numbered, name: seabedFacts(slug).name })))
  await tx.insert(families).values(world.families)
  const designId = idsBySlug(await tx.insert(designs)
    .values(world.designs.map(({ slug, name, family, description, settings, invented }) => ({ slug, name, family, description, settings, invented })))
    .returning({ id: designs.id, slug: designs.slug }))
  const rows = await tx.insert(sizes).values(world.sizes.map(({ design, currency, priceDate, ...facts }) =>
    ({ ...facts, designId: designId(design), priceCurrency: currency, priceOn: priceDate })))
    .returning({ id: sizes.id, designId: sizes.designId, massKg: sizes.massKg })
  const sizeIds = new Map(rows.map(row => [`${row.designId}/${row.massKg}`, row.id]))
  const sizeId = (design: string, massKg: number) => {
    const id = sizeIds.get(`${designId(design)}/${massKg}`)
    if (id === undefined) throw new Error(`the demo world pulls ${design} at ${massKg} kg, which is not one of its sizes`)
    return id
  }
  return { designId, sizeId }
}

/** Invented trials are published on the evening of their day. */
const eveningOf = ({ day }: { day: string }) => `${day}T18:00:00Z`

async function writeTrials(tx: Transaction, world: World) {
  const rigId = idsBySlug(await tx.insert(rigs).values(world.rigs.map(rig => ({
    slug: rig.slug, name: rig.name, vessel: rig.vessel, limitN: rig.limitN, stepsN: rig.thrustStepsN,
    holdS: rig.holdTimeS, calibratedOn: rig.calibrationDate, calibrationMethod: rig.calibrationMethod, calibrationSd: rig.calibrationSd, invented: true,
  }))).returning({ id: rigs.id, slug: rigs.slug }))
  return idsBySlug(await tx.insert(trials).values(world.trials.map(trial => ({
    slug: trial.slug, rigId: rigId(trial.rig), tester: trial.tester, day: trial.day, place: `${trial.place}, ${trial.sound}`,
    latitudeDeg: trial.latitudeDeg, longitudeDeg: trial.longitudeDeg, depthM: trial.depthM, windMs: trial.windMs, windFrom: trial.windFrom,
    currentMs: trial.currentMs, waveHeightM: trial.waveHeightM, seaState: trial.seaState, procedure: trial.procedure, note: trial.note,
    rode: { chainLengthM: trial.chainLengthM, chainDiameterMm: trial.chainMm, bowHeightM: trial.bowHeightM },
    publishedAt: eveningOf(trial), invented: true,
  }))).returning({ id: trials.id, slug: trials.slug }))
}

/** Writes every row of the demo world. The tables must be empty. */
export async function writeWorld(tx: Transaction, world: World): Promise<void> {
  const { designId, sizeId } = await writeCatalogue(tx, world)
  const modificationId = idsBySlug(await tx.insert(modifications)
    .values(world.modifications.map(({ slug, name, description, addedMassKg, priceMinor, currency, priceDate }) =>
      ({ slug, name, description, addedMassKg, priceMinor, priceCurrency: currency, priceOn: priceDate })))
    .returning({ id: modifications.id, slug: modifications.slug }))
  const trialId = await writeTrials(tx, world)
  const ofTheDay = new Map(world.trials.map(trial => [trial.slug, { shankAngleDeg: trial.shankAngleDeg, recordedAt: eveningOf(trial) }]))
  const rows = world.pulls.map(pull => ({
    ...ofTheDay.get(pull.trial), trialId: trialId(pull.trial), ordinal: pull.order, designId: designId(pull.design), sizeId: sizeId(pull.design, pull.massKg),
    modificationId: pull.modification === null ? null : modificationId(pull.modification),
    anchorSetting: pull.anchorSetting, pair: pull.pair, seabed: pull.seabed, setting: pull.setting, firstTry: pull.firstTry, fresh: pull.fresh,
    heldN: pull.heldN, movedN: pull.movedN, end: pull.end, creepMMin: pull.creepRateMPerMin,
    after: pull.after, veerDeg: pull.veerDeg, veer: pull.veerOutcome, attitude: pull.attitude, fouling: pull.fouling, condition: pull.condition,
    eastM: pull.eastM, northM: pull.northM, note: pull.note ?? '',
  }))
  for (let start = 0; start < rows.length; start += 200) await tx.insert(pulls).values(rows.slice(start, start + 200))
}
