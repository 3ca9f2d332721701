import 'server-only'
import { LRUCache } from 'lru-cache'
import { findDatasetSource } from '@/db/queries/dataset'
import { type Dataset, writeDataset } from '@/lib/dataset/files'
import { read } from './db'

// A released edition never changes, so its files are written once. Twelve editions of a megabyte or two each.
const written = new LRUCache<number, Promise<Dataset | null>>({ max: 12 })

/** The data set of a released edition; null where there is no such edition. Asked at once, written once. */
export function datasetOf(number: number): Promise<Dataset | null> {
  const known = written.get(number)
  if (known) return known
  const made = read((db) => findDatasetSource(db, number)).then((source) => source && writeDataset(source))
  written.set(number, made)
  // What failed, or is not there yet, is looked for again the next time.
  made.then(
    (dataset) => dataset ?? written.delete(number),
    () => written.delete(number),
  )
  return made
}
