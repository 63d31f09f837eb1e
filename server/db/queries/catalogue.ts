import { asc, eq } from 'drizzle-orm'
import type { CatalogueDesign } from '../../../shared/types/ranking'
import type { Family, Seabed, SoilKind } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, families, seabeds, sizes } from '../schema'

export interface ListedSize {
  massKg: number
  shankLengthMm: number | null
  flukeWidthMm: number | null
  overallHeightMm: number | null
  shackleHoleMm: number | null
  material: string | null
  shankStrengthN: number | null
  finish: string | null
  stowsFlat: boolean | null
  price: { minor: number, currency: string, on: string } | null
}

export interface ListedDesign {
  slug: string
  name: string
  family: Family
  familyName: string
  description: string
  settings: string[]
  invented: boolean
  sizes: ListedSize[]
}

export interface ListedSeabed { slug: Seabed, name: string, soil: SoilKind, numbered: boolean }

export function listedSize(size: typeof sizes.$inferSelect): ListedSize {
  const { id: _id, designId: _designId, priceMinor, priceCurrency, priceOn, ...facts } = size
  const price = priceMinor === null || priceCurrency === null || priceOn === null
    ? null
    : { minor: priceMinor, currency: priceCurrency, on: priceOn }
  return { ...facts, price }
}

/** Every design with its sizes, lightest first, in the order of their names. */
export async function listDesigns(db: Database | Transaction): Promise<ListedDesign[]> {
  const rows = await db.select({ design: designs, familyName: families.name, size: sizes }).from(designs)
    .innerJoin(families, eq(families.slug, designs.family))
    .leftJoin(sizes, eq(sizes.designId, designs.id))
    .orderBy(asc(designs.name), asc(designs.id), asc(sizes.massKg))
  const list = new Map<string, ListedDesign>()
  for (const { design, familyName, size } of rows) {
    const { id: _id, family, ...rest } = design
    const listed = list.get(design.slug) ?? { ...rest, family: family as Family, familyName, sizes: [] }
    if (size) listed.sizes.push(listedSize(size))
    list.set(design.slug, listed)
  }
  return [...list.values()]
}

/** The designs as the ranking needs them. */
export async function listCatalogue(db: Database | Transaction): Promise<CatalogueDesign[]> {
  return (await listDesigns(db)).map(({ slug, name, family, sizes: list }) =>
    ({ slug, name, family, sizesKg: list.map(size => size.massKg) }))
}

/** Every seabed of the product. */
export async function listSeabeds(db: Database | Transaction): Promise<ListedSeabed[]> {
  const rows = await db.select().from(seabeds).orderBy(asc(seabeds.slug))
  return rows.map(row => ({ ...row, slug: row.slug as Seabed, soil: row.soil as SoilKind }))
}
