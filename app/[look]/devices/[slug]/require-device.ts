import { notFound } from 'next/navigation'
import { cache } from 'react'
import { findDeviceBySlug, listDeviceEntries } from '@/db/queries/devices'
import { read } from '@/lib/server/db'
import { editionByNumber, latestEdition } from '@/lib/server/editions'
import type { LookParams } from '@/lib/server/look'

export type DeviceParams = LookParams & { slug: string }

const SLUG = /^[a-z0-9]+(-[a-z0-9]+)*$/
const LONGEST_SLUG = 100

/**
 * What is kept of the device at an address, and the newest edition that has it with what it froze; leaves with 404 where
 * there is no such device. `released` is null while no edition has it; `latest` is the newest edition of all.
 */
export const requireDevice = cache(async (slug: string) => {
  // An address may hold what the database cannot: it is asked for nothing but slugs.
  if (slug.length > LONGEST_SLUG || !SLUG.test(slug)) notFound()
  const [record, entries, latest] = await Promise.all([
    read((db) => findDeviceBySlug(db, slug)),
    read((db) => listDeviceEntries(db, slug)),
    latestEdition(),
  ])
  if (!record) notFound()
  const [entry] = entries
  const edition = entry ? await editionByNumber(entry.edition) : null
  return { record, entries, latest, released: entry && edition ? { entry, edition, device: entry.device } : null }
})
