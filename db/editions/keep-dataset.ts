import { asc, eq, isNull } from 'drizzle-orm'
import { writeDataset } from '@/lib/dataset/files'
import type { Db } from '../client'
import { findDatasetSource } from '../queries/dataset'
import { editionDatasets, editionFiles, editions } from '../schema'

/**
 * Writes the files of an edition's data set and keeps them as they are from now on. Part of the release of an edition.
 * @throws Error where there is no such edition, or its controls no longer give its figures
 */
export async function keepDataset(db: Db, edition: number): Promise<void> {
  const source = await findDatasetSource(db, edition)
  if (!source) throw new Error(`There is no edition ${edition} to write files of`)
  const { files, measuredFrom, measuredTo, rows } = writeDataset(source)
  await db.insert(editionDatasets).values({ edition, measuredFrom, measuredTo, rows })
  await db.insert(editionFiles).values([...files.values()].map((file, place) => ({ edition, place, ...file })))
}

/** Keeps the files of editions released before files were kept. */
export async function keepMissingDatasets(db: Db): Promise<void> {
  const missing = await db
    .select({ number: editions.number })
    .from(editions)
    .leftJoin(editionDatasets, eq(editionDatasets.edition, editions.number))
    .where(isNull(editionDatasets.edition))
    .orderBy(asc(editions.number))
  for (const { number } of missing) await db.transaction((tx) => keepDataset(tx, number))
}
