import 'server-only'
import { LRUCache } from 'lru-cache'
import { cache } from 'react'
import { listEditionSpectra } from '@/db/queries/spectra'
import { type DeviceSpectra, meanSpectra } from '@/lib/light/spectra'
import { read } from './db'

// The readings of a released edition never change, so means once made are good for as long as the process lives.
const made = new LRUCache<number, Map<string, DeviceSpectra>>({ max: 12 })

/** Mean reflectance of the devices of a released edition, by slug; a device without spectra is not among them. */
export const editionSpectra = cache(async (edition: number): Promise<ReadonlyMap<string, DeviceSpectra>> => {
  const known = made.get(edition)
  if (known) return known
  const spectra = meanSpectra(await read((db) => listEditionSpectra(db, edition)))
  made.set(edition, spectra)
  return spectra
})
