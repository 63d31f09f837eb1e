/** A request that is answered: what stands in the address, and what is sent. */
export interface Example { address?: Readonly<Record<string, string | number>>, body?: unknown }

const boat = { type: 'sailMonohull', lengthM: 11.2, beamM: 3.6, displacementKg: 7400 }
const wind = { speedMs: 15.4, kind: 'gust' }
const rode = { chain: { lengthM: 45, diameterMm: 10, grade: 'G40' }, snubber: { lengthM: 8, diameterMm: 16 } }
const plan = { boat, wind, rode, depthM: 8, seabeds: [{ seabed: 'sandy-mud', share: 0.6 }, { seabed: 'loose-sand', share: 0.4 }], massKg: 20 }

const pull = { design: 'mine', family: 'plain-scoop', massKg: 20, seabed: 'loose-sand' }

/** One a route, by its operation's id; shown in the API's description, and answered by the demo world as they stand. */
export const examples: Readonly<Record<string, Example>> = {
  loads: { body: { boat, wind } },
  rodes: { body: { heightM: 9.5, horizontalLoadN: 2500, ...rode } },
  rankings: { body: plan },
  fits: { body: { pulls: [
    { ...pull, trial: 'Monday', heldN: 2300, movedN: 2600 }, { ...pull, trial: 'Monday', heldN: 2600, movedN: null }, { ...pull, trial: 'Tuesday', heldN: 1750, movedN: 2000 },
  ] } },
  chartNotation: { address: { text: 'fS.M.Sh' } },
  designs: { address: { family: 'plain-scoop', sort: 'name' } },
  design: { address: { slug: 'fennigar', massKg: 20 } },
  seabed: { address: { slug: 'loose-sand', massKg: 20 } },
  trials: { address: { seabed: 'gravel' } },
  trial: { address: { slug: 'hollin-roads-2024-04-16' } },
  trialPulls: { address: { slug: 'hollin-roads-2024-04-16' } },
  questions: { address: { id: 1 }, body: { question: 'The chart has weed at this place: was it looked for?', mailAddress: 'name@example.org' } },
  estimates: { address: { seabed: 'loose-sand', design: 'fennigar' } },
  comparisons: { body: { anchors: [{ design: 'fennigar' }, { design: 'dunnavet' }], massKg: 20 } },
  modification: { address: { slug: 'shank-edge-blunted' } },
  modificationWorths: { body: { modification: 'shank-edge-blunted', plan } },
  release: { address: { version: '2026' } },
  releaseFile: { address: { version: '2026', file: 'pulls.csv' } },
}
