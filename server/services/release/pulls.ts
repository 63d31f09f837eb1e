import type { ReleasePull } from '#shared/types/release'
import { attitudes, conditions, foulings, numberedSeabeds, pullAfters, pullEnds, settingOutcomes, veerOutcomes } from '#shared/types/words'
import { column, type Table } from './table'

const columns: Table<ReleasePull>['columns'] = [
  column('pull', 'string', 'name of the pull: its trial and its number there', row => row.pull, { unique: true }),
  column('trial', 'string', 'trial', row => row.trial),
  column('ordinal', 'integer', 'number of the pull in its trial', row => row.ordinal, { minimum: 1 }),
  column('design', 'string', 'design', row => row.design),
  column('mass_kg', 'number', 'mass of the anchor', row => row.massKg, { unit: 'kg', minimum: 0.5, maximum: 2000 }),
  column('modification', 'string', 'change made to the anchor; empty: none', row => row.modification, { optional: true }),
  column('anchor_setting', 'string', 'fluke setting of its maker; empty: it has none', row => row.anchorSetting, { optional: true }),
  column('pair', 'string', 'the same on both pulls of a back-to-back pair: same day, within 50 m, alternated; empty: no pair', row => row.pair, { optional: true }),
  column('seabed', 'string', 'seabed', row => row.seabed, { enum: numberedSeabeds }),
  column('setting', 'string', 'how it set', row => row.setting, { enum: settingOutcomes }),
  column('first_try', 'boolean', 'set at the first try, without dragging first', row => row.firstTry),
  column('fresh', 'boolean', 'false: made after a breakout in the same deployment, and no pull of its own in the fit', row => row.fresh),
  column('held_n', 'number', 'greatest load held, horizontal at the anchor; 0 where it set and moved at the first step, and where it did not set', row => row.heldN, { unit: 'N', minimum: 0, maximum: 1_000_000 }),
  column('moved_n', 'number', 'first step above it at which it moved; empty: the rig\'s limit, stopped early, or never set', row => row.movedN, { unit: 'N', minimum: 1, maximum: 1_000_000, optional: true }),
  column('shank_angle_deg', 'number', 'angle of the rode at the shank, from the trial\'s own rode', row => row.shankAngleDeg, { unit: 'deg', minimum: 0, maximum: 60 }),
  column('ended', 'string', 'how it ended; empty: nothing to end', row => row.end, { enum: pullEnds, optional: true }),
  column('creep_m_min', 'number', 'mean creep at the step that moved it, where it crept', row => row.creepMMin, { unit: 'm/min', minimum: 0, maximum: 100, optional: true }),
  column('after', 'string', 'what it did after breaking out', row => row.after, { enum: pullAfters, optional: true }),
  column('veer_deg', 'number', 'by how much the load was turned; empty: no veer pull', row => row.veerDeg, { unit: 'deg', minimum: 0, maximum: 180, optional: true }),
  column('veer', 'string', 'what it did when the load was turned', row => row.veer, { enum: veerOutcomes, optional: true }),
  column('east_m', 'number', 'east of the trial\'s rounded position', row => row.eastM, { unit: 'm', optional: true }),
  column('north_m', 'number', 'north of the trial\'s rounded position', row => row.northM, { unit: 'm', optional: true }),
  column('attitude', 'string', 'how it lay', row => row.attitude, { enum: attitudes }),
  column('fouling', 'string', 'what was on it', row => row.fouling, { enum: foulings }),
  column('condition', 'string', 'its state afterwards', row => row.condition, { enum: conditions }),
  column('note', 'string', 'note', row => row.note, { optional: true }),
]

const refers = [
  ['trial', 'trials', 'trial'], ['design', 'designs', 'design'], ['modification', 'modifications', 'modification'], ['seabed', 'seabeds', 'seabed'],
] as const

export const pulls: Table<ReleasePull> = { name: 'pulls', title: 'Pulls that stand: one anchor set and loaded in steps', key: ['trial', 'ordinal'], refers, columns }

export const supersededPulls: Table<ReleasePull> = {
  name: 'superseded_pulls', title: 'Pulls that a correction took the place of; no part of the fit', key: ['trial', 'ordinal'], refers,
  columns: [...columns, column('superseded_by', 'string', 'the pull that stands in its place, or was itself corrected', row => row.supersededBy)],
}
