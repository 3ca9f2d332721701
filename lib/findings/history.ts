import { type MovedFigure, movedFigures } from '@/lib/edition/changes-figures'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { type PublishedFigures, publishedFigures } from './published'

/** What one edition froze of a device. */
export type Entry = {
  edition: number
  revision: string
  device: EditionDevice
  setIds: readonly number[]
  uncertainty: Edition['uncertainty']
  control: Edition['control']
}

type Correction = { id: number; wrongIn: number | null; rightIn: number | null }

export type HistoryRow = {
  edition: number
  revision: string
  figures: PublishedFigures
  /**
   * Against the edition before that had the device. `same`: from the same sets. `revision`: of another revision, so that
   * nothing changed but what was measured. `readings`: some sets are new or gone; the figures that moved, with the doubt
   * of each change.
   */
  change: { kind: 'first' | 'same' | 'revision' } | { kind: 'readings'; since: number; moved: MovedFigure[] }
  /** Corrections that name this edition: it was wrong, or it puts right. */
  corrections: { id: number; as: 'wrong' | 'corrected' }[]
}

/**
 * A device's figures through the editions, in the order given.
 * @param entries newest edition first
 */
export function historyOf(entries: readonly Entry[], corrections: readonly Correction[]): HistoryRow[] {
  return entries.map((entry, i) => ({
    edition: entry.edition,
    revision: entry.revision,
    figures: publishedFigures(entry, entry.device),
    change: changeBetween(entry, entries[i + 1]),
    corrections: corrections.flatMap((correction) => markOf(correction, entry.edition)),
  }))
}

/** How a correction marks an edition. One between the wrong edition and the right one repeats what was wrong. */
function markOf({ id, wrongIn, rightIn }: Correction, edition: number): HistoryRow['corrections'] {
  if (rightIn === edition) return [{ id, as: 'corrected' }]
  const wrong = wrongIn !== null && edition >= wrongIn && (rightIn === null || edition < rightIn)
  return wrong ? [{ id, as: 'wrong' }] : []
}

function changeBetween(now: Entry, before: Entry | undefined): HistoryRow['change'] {
  if (!before) return { kind: 'first' }
  if (now.revision !== before.revision) return { kind: 'revision' }
  if (sameSets(now.setIds, before.setIds)) return { kind: 'same' }
  return { kind: 'readings', since: before.edition, moved: movedFigures(before, now) }
}

function sameSets(one: readonly number[], other: readonly number[]): boolean {
  const known = new Set(one)
  return one.length === other.length && other.every((id) => known.has(id))
}
