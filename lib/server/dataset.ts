import 'server-only'
import { LRUCache } from 'lru-cache'
import { findDataset } from '@/db/queries/dataset'
import type { Dataset } from '@/lib/dataset/files'
import { read } from './db'

// A released data set never changes. Twelve editions of a megabyte or two each.
const known = new LRUCache<number, Promise<Dataset | null>>({ max: 12 })

/** The data set of a released edition; null where there is no such edition. Asked at once, read once. */
export function datasetOf(number: number): Promise<Dataset | null> {
  const held = known.get(number)
  if (held) return held
  const found = read((db) => findDataset(db, number))
  known.set(number, found)
  // What failed, or is not there yet, is looked for again the next time.
  found.then(
    (dataset) => dataset ?? known.delete(number),
    () => known.delete(number),
  )
  return found
}
