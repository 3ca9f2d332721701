import { and, asc, eq, isNotNull, ne, sql } from 'drizzle-orm'
import type { Db } from '../client'
import { editionEntries, readings, sets } from '../schema'

/** Reflectance spectra among the readings an edition's figures rest on, by device, set and reading. */
export async function listEditionSpectra(db: Db, edition: number) {
  const rows = await db
    .select({
      slug: editionEntries.slug,
      unit: sets.unitId,
      set: sets.id,
      state: sets.state,
      spectrum: readings.spectrum,
    })
    .from(editionEntries)
    .innerJoin(sets, sql`${sets.id} = any(${editionEntries.setIds})`)
    .innerJoin(readings, eq(readings.setId, sets.id))
    .where(and(eq(editionEntries.edition, edition), isNotNull(readings.spectrum), ne(readings.flag, 'left-out')))
    .orderBy(asc(editionEntries.slug), asc(sets.id), asc(readings.ordinal))
  return rows.flatMap(({ spectrum, ...row }) => (spectrum ? [{ ...row, spectrum }] : []))
}
