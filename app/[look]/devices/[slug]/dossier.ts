import type { DeviceRecord } from '@/db/queries/devices'
import type { EvidenceSet } from '@/lib/findings/evidence'
import type { EditionDevice } from '@/lib/method/types'

export type RecordedSet = DeviceRecord['sets'][number]

/** Why a set is not among those a figure rests on; null where it is. */
export function whyNotCounted(set: RecordedSet, device: EditionDevice, unitIds: ReadonlySet<number>): string | null {
  if (set.withdrawnReason !== null) return `withdrawn: ${set.withdrawnReason}`
  if (set.specular === 'excluded') return 'specular excluded: shown beside, never mixed in'
  if (!unitIds.has(set.unitId)) return 'a unit of another revision'
  return Object.hasOwn(device.sessions, set.session) ? null : 'of a session outside this edition'
}

/** The units of the revision the edition's figures belong to. */
export function unitsOf(record: DeviceRecord, device: EditionDevice): DeviceRecord['units'] {
  const revision = record.revisions.find(({ name }) => name === device.revision)
  return record.units.filter(({ revisionId }) => revisionId === revision?.id)
}

/** The sets a device's figures rest on, with the readings that count. */
export function countedSets(record: DeviceRecord, device: EditionDevice): (EvidenceSet & { source: RecordedSet })[] {
  const unitIds = new Set(unitsOf(record, device).map(({ id }) => id))
  return record.sets
    .filter((set) => whyNotCounted(set, device, unitIds) === null)
    .map((set) => ({
      unit: String(set.unitId),
      position: set.position,
      state: set.state,
      measuredOn: set.startedAt.toISOString().slice(0, 10),
      readings: set.readings
        .filter(({ flag }) => flag !== 'left-out')
        .map(({ lStar, aStar, bStar }) => ({ L: lStar, a: aStar, b: bStar })),
      source: set,
    }))
    .filter(({ readings }) => readings.length > 0)
}

/** The newest statement of each fact of the edition's revision. */
export function newestSpecs(record: DeviceRecord, device: EditionDevice): DeviceRecord['specs'] {
  const revision = record.revisions.find(({ name }) => name === device.revision)
  const seen = new Set<string>()
  // The query puts the newest of each field first.
  return record.specs.filter(({ revisionId, field }) => {
    if (revisionId !== revision?.id || seen.has(field)) return false
    seen.add(field)
    return true
  })
}
