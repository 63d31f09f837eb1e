import type { StoredFit } from '#shared/types/holding'
import type { CatalogueDesign } from '#shared/types/ranking'
import type { Database } from '../db/client'
import { listen } from '../db/listen'
import { listCatalogue } from '../db/queries/catalogue'
import { fitChannel, newestFitId, readFit } from '../db/queries/fits'
import { countRigs } from '../db/queries/pulls'
import { log } from '../utils/log'

/** What answers rest on: the newest fit, the designs with their sizes, how many rigs made the pulls. */
export interface Evidence { fit: StoredFit, catalogue: CatalogueDesign[], rigs: number }

interface Source { db: Database, stop: () => Promise<void> }

const pollMs = 15_000

let source: Source | null = null
let held: Evidence | null = null
let running: Promise<void> | null = null
let wanted = false

async function read(db: Database): Promise<void> {
  const id = await newestFitId(db)
  if (id === null) return
  const fit = id === held?.fit.id ? held.fit : await readFit(db, id)
  const [catalogue, rigs] = await Promise.all([listCatalogue(db), countRigs(db)])
  if (fit) held = { fit, catalogue, rigs }
}

/**
 * Reads what there is to read. One reading at a time: whoever asks while one runs waits for it, and what was noticed meanwhile is
 * answered by one more, however many noticed it.
 */
function refresh(db: Database): Promise<void> {
  wanted = true
  running ??= (async () => {
    while (wanted) {
      wanted = false
      await read(db).catch(error => log.warn('the evidence could not be read', { error: (error as Error).message }))
    }
  })().finally(() => {
    running = null
  })
  return running
}

/** Starts to keep the newest fit in memory: told by the database at once, asked again every 15 s in case a notice was lost. */
export function startEvidence(db: Database, url: string): void {
  const silence = listen(url, fitChannel, () => void refresh(db))
  const timer = setInterval(() => void refresh(db), pollMs)
  source = { db, stop: async () => {
    clearInterval(timer)
    await silence()
  } }
}

export async function stopEvidence(): Promise<void> {
  await source?.stop()
  source = null
  held = null
}

/** The evidence that answers rest on now; null until there is a fit. */
export async function currentEvidence(): Promise<Evidence | null> {
  if (!held && source) await (running ?? refresh(source.db))
  return held
}
