import { mayRead, type Actor } from '#shared/access/mayRead'
import { seabedFacts } from '#shared/seabed/seabeds'
import type { EstimateListing, EstimatesAnswer, SeabedsAnswer } from '#shared/types/catalogue'
import type { DesignEstimate, SeabedFit } from '#shared/types/holding'
import type { NumberedSeabed } from '#shared/types/words'
import { listSeabeds } from '../db/queries/catalogue'
import { database } from './application'
import { standingEvidence } from './standing'

/** The seabeds with what they are. */
export async function seabeds(actor: Actor): Promise<SeabedsAnswer> {
  const all = await listSeabeds(database())
  return {
    seabeds: all.filter(({ slug }) => mayRead(actor, { what: 'seabed', seabed: slug }).allowed).map((seabed) => {
      const { description, notation, cautions } = seabedFacts(seabed.slug)
      return { ...seabed, description, notation, cautions: [...cautions] }
    }),
  }
}

/** Half width of a 90 % interval in standard deviations. */
const z90 = 1.6448536269514722

function listed({ seabed }: SeabedFit, estimate: DesignEstimate): EstimateListing {
  const at = (sds: number) => Math.exp(estimate.lnMean15Kg + sds * estimate.lnSd)
  return { ...estimate, seabed, holding15KgN: { median: at(0), low90: at(-z90), high90: at(z90) } }
}

/** What the newest fit says of each design on each seabed that it was asked about. @throws ApiError 503 while there is no fit */
export async function estimates(actor: Actor, query: { seabed?: NumberedSeabed, design?: string }): Promise<EstimatesAnswer> {
  const { fit } = await standingEvidence()
  const wanted = fit.seabeds.filter(({ seabed }) => (query.seabed ?? seabed) === seabed && mayRead(actor, { what: 'estimate', seabed }).allowed)
  return {
    fit: { id: fit.id, modelVersion: fit.modelVersion, at: fit.at, dataHash: fit.dataHash },
    sigma: fit.sigma,
    estimates: wanted.flatMap(seabed => seabed.designs
      .filter(({ design }) => (query.design ?? design) === design)
      .map(estimate => listed(seabed, estimate))),
  }
}
