import type { LoadAnswer, LoadRequest } from '#shared/types/load'
import { completeBoat, type CompleteBoat } from '#shared/load/boat'
import { currentLoadN } from '#shared/load/current'
import { surgeEnergyJ } from '#shared/load/energy'
import { surveyLoad, windLoads } from '#shared/load/survey'
import { tableLoad } from '#shared/load/table'
import { surgePeak } from '#shared/rode/surge'
import { FieldError } from '#shared/utils/fieldError'
import { withRodeFields } from '#shared/ranking/rodeFields'

/** What completeBoat may have guessed, in words. */
const guessedWords: Readonly<Record<string, string>> = {
  beamM: 'beam',
  freeboardM: 'freeboard',
  bowHeightM: 'bow height',
  displacementKg: 'displacement',
  windage: 'windage',
  sideAreaM2: 'side area',
  sideDragCoefficient: 'drag of the side',
  waterline: 'waterline and draught',
  propellerAreaM2: 'propeller',
}

interface Surge { surgeN: number | null, note?: string }

/** Peak of the surge above the gust's load: 0 without swell, null with the reason where the rode cannot bound it. */
function surgeOf({ rode, heightM, swell = 'none' }: LoadRequest, boat: CompleteBoat, gustN: number): Surge {
  const energyJ = surgeEnergyJ(boat.displacementKg, swell)
  if (energyJ === 0) return { surgeN: 0 }
  if (rode === undefined) throw new FieldError('rode', 'rode must be given with swell: how far it stretches decides the peak')
  if (heightM === undefined) throw new FieldError('heightM', 'heightM must be given with swell: seabed to bow, m')
  const peak = withRodeFields(() => surgePeak({ rode, heightM, steadyN: gustN, energyJ }))
  return peak.peakN === null ? { surgeN: null, note: peak.why } : { surgeN: Math.max(0, peak.peakN - gustN) }
}

function sentence(text: string): string {
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}.`
}

/** What was guessed or taken, and last, where there is no total, why the rode cannot bound the surge. */
function notesOf(request: LoadRequest, boat: CompleteBoat, surge: Surge): string[] {
  const notes: string[] = []
  if (boat.guessed.length > 0) notes.push(`Guessed, since not given: ${boat.guessed.map(name => guessedWords[name] ?? name).join(', ')}.`)
  if (request.wind.at10m) notes.push('The wind was taken as a forecast for 10 m and brought down to the windage\'s centre, 2 m.')
  if (surge.note !== undefined) notes.push(sentence(surge.note))
  return notes
}

/**
 * What the boat asks of the anchor, two answers side by side: the survey load, the best estimate, and the table load, a
 * conservative envelope. POST /api/loads; also runs in the browser.
 *
 * totalN = max(sheerN, gustN + surgeN) + currentN; designN = max(totalN, table load + currentN), for strength; both null
 * where the rode cannot bound the surge.
 *
 * @param request see its type; with swell, the rode and the height from seabed to bow are needed
 * @throws FieldError naming the field that is missing or out of range
 *
 * Source: see survey.ts, table.ts and surge.ts.
 */
export function answerLoads(request: LoadRequest): LoadAnswer {
  const boat = completeBoat(request.boat)
  const wind = windLoads(boat, request.wind)
  const currentN = currentLoadN(boat, request.currentMs ?? 0)
  const surge = surgeOf(request, boat, wind.gustN)
  const survey = surveyLoad(wind, currentN, surge.surgeN)
  const { table, note } = tableLoad(boat, request.wind.speedMs)
  const { totalN } = survey
  return {
    table,
    ...(note === undefined ? {} : { tableNote: note }),
    survey,
    designN: totalN === null ? null : Math.max(totalN, (table?.loadN ?? 0) + currentN),
    notes: notesOf(request, boat, surge),
  }
}
