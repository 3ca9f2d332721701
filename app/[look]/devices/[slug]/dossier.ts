import type { DeviceEntry, DeviceRecord } from '@/db/queries/devices'
import type { EvidenceSet } from '@/lib/findings/evidence'
import { METHOD } from '@/lib/method/constants'

export type RecordedSet = DeviceRecord['sets'][number]
type Reading = RecordedSet['readings'][number]

/** Readings of a set that count: those left out stay visible and are not among them. */
export function acceptedReadings({ readings }: RecordedSet): Reading[] {
  return readings.filter(({ flag }) => flag !== 'left-out')
}

/** The units of the revision the edition's figures belong to. */
export function unitsOf(record: DeviceRecord, entry: DeviceEntry): DeviceRecord['units'] {
  return record.units.filter(({ revisionId }) => revisionId === entry.revisionId)
}

/** What to know of a set beside its readings: why the edition's figures do not rest on it, or what was found since. */
export function noteOn(set: RecordedSet, record: DeviceRecord, entry: DeviceEntry | null): string | null {
  if (entry?.setIds.includes(set.id)) {
    // A released edition keeps its figures; only the next can leave the set out.
    return set.withdrawnReason === null ? null : `withdrawn since the edition: ${set.withdrawnReason}`
  }
  if (set.withdrawnReason !== null) return `withdrawn: ${set.withdrawnReason}`
  if (set.specular === 'excluded') return 'specular excluded: shown beside, never mixed in'
  if (!set.lightOff) return 'front light not off'
  if (!entry) return 'no edition rests on it yet'
  if (!unitsOf(record, entry).some(({ id }) => id === set.unitId)) return 'a unit of another revision'
  if (set.startedAt > entry.publishedAt) return 'read after this edition'
  const least = METHOD.figures.leastReadings.value
  return acceptedReadings(set).length < least ? `fewer than ${least} accepted readings` : 'not in this edition'
}

export type CountedSet = EvidenceSet & { source: RecordedSet }

/** The sets an edition's figures rest on, with the readings that count. */
export function countedSets(record: DeviceRecord, entry: DeviceEntry): CountedSet[] {
  const counted = new Set(entry.setIds)
  const serials = new Map(record.units.map(({ id, serial }) => [id, serial]))
  return record.sets
    .filter(({ id }) => counted.has(id))
    .map((set) => ({
      unit: serials.get(set.unitId) ?? String(set.unitId),
      position: set.position,
      state: set.state,
      measuredOn: set.startedAt.toISOString().slice(0, 10),
      readings: acceptedReadings(set).map(({ lStar, aStar, bStar }) => ({ L: lStar, a: aStar, b: bStar })),
      source: set,
    }))
    .filter(({ readings }) => readings.length > 0)
}

/** The newest statement of each fact of the edition's revision. */
export function newestSpecs(record: DeviceRecord, entry: DeviceEntry): DeviceRecord['specs'] {
  const seen = new Set<string>()
  // The query puts the newest of each field first.
  return record.specs.filter(({ revisionId, field }) => {
    if (revisionId !== entry.revisionId || seen.has(field)) return false
    seen.add(field)
    return true
  })
}

/** Where the edition's price was seen, newest first; null where it names none, or nobody noted it. */
export function priceSeen({ prices }: DeviceRecord, { device }: DeviceEntry): DeviceRecord['prices'][number] | null {
  const { price } = device
  return (
    prices.find(({ amountMinor, currency }) => amountMinor === price?.amount && currency === price.currency) ?? null
  )
}
