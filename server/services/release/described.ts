import { families, numberedSeabeds, soilKinds } from '#shared/types/words'
import type { DescribedDesign, DescribedModification, DescribedRig, DescribedSeabed, DescribedSize, DescribedTrial } from '#shared/types/release'
import { column, type Table } from './table'

const invented = 'made up for a demonstration: no such thing exists'

export const seabeds: Table<DescribedSeabed> = {
  name: 'seabeds', title: 'Seabeds that were pulled on', key: ['seabed'],
  columns: [
    column('seabed', 'string', 'name of the seabed', row => row.slug, { enum: numberedSeabeds }),
    column('name', 'string', 'in words', row => row.name),
    column('soil', 'string', 'soil kind, which decides the exponent of the mass: soft 0.92, mixed 0.86, hard 0.80', row => row.soil, { enum: soilKinds }),
  ],
}

export const designs: Table<DescribedDesign> = {
  name: 'designs', title: 'Anchor designs that were pulled', key: ['design'],
  columns: [
    column('design', 'string', 'name of the design in addresses and tables', row => row.slug),
    column('name', 'string', 'name in words', row => row.name),
    column('family', 'string', 'family of the design', row => row.family, { enum: families }),
    column('family_name', 'string', 'family in words', row => row.familyName),
    column('description', 'string', 'description', row => row.description, { optional: true }),
    column('settings', 'string', 'fluke settings that its maker provides, between semicolons', row => row.settings.join('; '), { optional: true }),
    column('invented', 'boolean', invented, row => row.invented),
  ],
}

export const sizes: Table<DescribedSize> = {
  name: 'sizes', title: 'Sizes that were pulled, with what is stated of them', key: ['design', 'mass_kg'], refers: [['design', 'designs', 'design']],
  columns: [
    column('design', 'string', 'design', row => row.design),
    column('mass_kg', 'number', 'mass', row => row.massKg, { unit: 'kg', minimum: 0.5, maximum: 2000 }),
    column('shank_length_mm', 'number', 'shank length; empty: not stated', row => row.shankLengthMm, { unit: 'mm', optional: true }),
    column('fluke_width_mm', 'number', 'fluke width; empty: not stated', row => row.flukeWidthMm, { unit: 'mm', optional: true }),
    column('overall_height_mm', 'number', 'overall height; empty: not stated', row => row.overallHeightMm, { unit: 'mm', optional: true }),
    column('shackle_hole_mm', 'number', 'shackle hole; empty: not stated', row => row.shackleHoleMm, { unit: 'mm', optional: true }),
    column('material', 'string', 'material; empty: not stated', row => row.material, { optional: true }),
    column('shank_strength_n', 'number', 'strength of the shank; empty: not stated', row => row.shankStrengthN, { unit: 'N', optional: true }),
    column('finish', 'string', 'finish; empty: not stated', row => row.finish, { optional: true }),
    column('stows_flat', 'boolean', 'stows flat; empty: not stated', row => row.stowsFlat, { optional: true }),
  ],
}

export const modifications: Table<DescribedModification> = {
  name: 'modifications', title: 'Changes made to anchors for a trial', key: ['modification'],
  columns: [
    column('modification', 'string', 'name of the modification in addresses and tables', row => row.slug),
    column('name', 'string', 'name in words', row => row.name),
    column('description', 'string', 'description', row => row.description, { optional: true }),
    column('added_mass_kg', 'number', 'what it adds to an anchor of 20 kg; empty: not stated', row => row.addedMassKg, { unit: 'kg', optional: true }),
  ],
}

export const rigs: Table<DescribedRig> = {
  name: 'rigs', title: 'Rigs: how a tester pulls and measures', key: ['rig'],
  columns: [
    column('rig', 'string', 'name of the rig in tables', row => row.slug),
    column('name', 'string', 'name in words', row => row.name),
    column('vessel', 'string', 'vessel', row => row.vessel, { optional: true }),
    column('method', 'string', 'how it pulls', row => row.method, { optional: true }),
    column('limit_n', 'number', 'most that it can pull', row => row.limitN, { unit: 'N', minimum: 10, maximum: 1_000_000 }),
    column('hold_s', 'number', 'how long a step must be held', row => row.holdS, { unit: 's', minimum: 1, maximum: 3600 }),
    column('calibrated_on', 'date', 'day of its calibration', row => row.calibratedOn, { optional: true }),
    column('calibration_method', 'string', 'how it was calibrated', row => row.calibrationMethod, { optional: true }),
    column('calibration_sd', 'number', 'standard deviation of the calibration error in ln load; empty: not stated, 0.10 in the fit', row => row.calibrationSd, { unit: '1', minimum: 0, maximum: 1, optional: true }),
    column('invented', 'boolean', invented, row => row.invented),
  ],
}

interface Step { rig: string, step: number, loadN: number }

export const stepsOf = (rows: readonly DescribedRig[]): Step[] =>
  rows.flatMap(({ slug, stepsN }) => stepsN.map((loadN, i) => ({ rig: slug, step: i + 1, loadN })))

export const rigSteps: Table<Step> = {
  name: 'rig_steps', title: 'Loads that a rig steps through', key: ['rig', 'step'], refers: [['rig', 'rigs', 'rig']],
  columns: [
    column('rig', 'string', 'rig', row => row.rig),
    column('step', 'integer', 'number of the step, from 1', row => row.step, { minimum: 1 }),
    column('load_n', 'number', 'load of the step', row => row.loadN, { unit: 'N', minimum: 0 }),
  ],
}

export const trials: Table<DescribedTrial> = {
  name: 'trials', title: 'Trials: a day of pulls by one tester at one place', key: ['trial'], refers: [['rig', 'rigs', 'rig']],
  columns: [
    column('trial', 'string', 'name of the trial in addresses and tables', row => row.slug),
    column('day', 'date', 'day', row => row.day),
    column('tester', 'string', 'who pulled', row => row.tester),
    column('rig', 'string', 'rig', row => row.rig),
    column('place', 'string', 'place', row => row.place),
    column('latitude_deg', 'number', 'latitude, north positive, rounded as the tester chose; empty: kept back', row => row.latitudeDeg, { unit: 'deg', minimum: -90, maximum: 90, optional: true }),
    column('longitude_deg', 'number', 'longitude, east positive, rounded as the tester chose; empty: kept back', row => row.longitudeDeg, { unit: 'deg', minimum: -180, maximum: 180, optional: true }),
    column('depth_m', 'number', 'depth of the water', row => row.depthM, { unit: 'm', minimum: 0.5, maximum: 100 }),
    column('wind_ms', 'number', 'wind; empty: not recorded', row => row.windMs, { unit: 'm/s', minimum: 0, maximum: 60, optional: true }),
    column('wind_from', 'string', 'where the wind came from', row => row.windFrom, { optional: true }),
    column('current_ms', 'number', 'current; empty: not recorded', row => row.currentMs, { unit: 'm/s', minimum: 0, maximum: 5, optional: true }),
    column('wave_height_m', 'number', 'height of the waves; empty: not recorded', row => row.waveHeightM, { unit: 'm', minimum: 0, maximum: 20, optional: true }),
    column('sea_state', 'string', 'sea state in words', row => row.seaState, { optional: true }),
    column('chain_length_m', 'number', 'chain out', row => row.chainLengthM, { unit: 'm', minimum: 0 }),
    column('chain_diameter_mm', 'number', 'diameter of the chain', row => row.chainDiameterMm, { unit: 'mm', minimum: 0 }),
    column('rope_length_m', 'number', 'rope out; empty: none', row => row.ropeLengthM, { unit: 'm', minimum: 0, optional: true }),
    column('rope_diameter_mm', 'number', 'diameter of the rope; empty: none', row => row.ropeDiameterMm, { unit: 'mm', minimum: 0, optional: true }),
    column('bow_height_m', 'number', 'roller above the water', row => row.bowHeightM, { unit: 'm', minimum: 0 }),
    column('procedure', 'string', 'how the day went about it', row => row.procedure, { optional: true }),
    column('note', 'string', 'note', row => row.note, { optional: true }),
    column('published_at', 'datetime', 'when it was published, UTC', row => row.publishedAt),
    column('invented', 'boolean', invented, row => row.invented),
  ],
}
