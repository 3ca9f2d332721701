import 'server-only'
import { LRUCache } from 'lru-cache'
import { cache } from 'react'
import { findEdition, findLatestEditionNumber } from '@/db/queries/editions'
import type { Edition } from '@/lib/method/types'
import { read } from './db'

// A released edition never changes, so a document once read is good for as long as the process lives.
const released = new LRUCache<number, Edition>({ max: 12 })

/** The released edition of this number; null where there is none. */
export const editionByNumber = cache(async (number: number): Promise<Edition | null> => {
  const known = released.get(number)
  if (known) return known
  const edition = await read((db) => findEdition(db, number))
  if (edition) released.set(number, edition)
  return edition
})

/** The newest released edition; null while none has been released. One small query finds its number. */
export const latestEdition = cache(async (): Promise<Edition | null> => {
  const number = await read(findLatestEditionNumber)
  return number === null ? null : editionByNumber(number)
})
