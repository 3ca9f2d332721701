import { and, asc, eq, ne, sql } from 'drizzle-orm'
import { METHOD } from '@/lib/method/constants'
import type { SetReadings } from '@/lib/method/figures'
import type { Db } from '../client'
import { devices, makers, readings, revisions, sessions, sets, units } from '../schema'
import { sessionCounts } from './session-counts'

/** A revision that can stand in an edition, with the sets its figures rest on. */
export type Candidate = {
  slug: string
  name: string
  maker: string
  deviceId: number
  revisionId: number
  revision: string
  sets: SetReadings[]
  setIds: number[]
}

/**
 * The revisions an edition of this moment may print, in the order of their slugs: of each device the newest with
 * counting sets of both states; one whose first day is not known counts as the oldest. A set counts that was measured
 * at d/8°, specular included, D65, 10°, front light off, with five accepted readings or more, in a session ended before,
 * and that had not been withdrawn by then.
 */
export async function listCandidates(db: Db, at: Date): Promise<Candidate[]> {
  const rows = await db
    .select({
      slug: devices.slug,
      name: devices.name,
      maker: makers.name,
      deviceId: devices.id,
      revisionId: revisions.id,
      revision: revisions.name,
      since: revisions.since,
      setId: sets.id,
      session: sessions.name,
      unit: units.serial,
      position: sets.position,
      state: sets.state,
      withdrawnAt: sets.withdrawnAt,
      L: readings.lStar,
      a: readings.aStar,
      b: readings.bStar,
    })
    .from(readings)
    .innerJoin(sets, eq(sets.id, readings.setId))
    .innerJoin(sessions, eq(sessions.id, sets.sessionId))
    .innerJoin(units, eq(units.id, sets.unitId))
    .innerJoin(revisions, eq(revisions.id, units.revisionId))
    .innerJoin(devices, eq(devices.id, revisions.deviceId))
    .innerJoin(makers, eq(makers.id, devices.makerId))
    .where(
      and(ne(readings.flag, 'left-out'), eq(sets.specular, 'included'), eq(sets.lightOff, true), sessionCounts(at)),
    )
    .orderBy(
      asc(devices.slug),
      sql`${revisions.since} asc nulls first`,
      asc(revisions.id),
      asc(sets.id),
      asc(readings.ordinal),
    )

  const byRevision = new Map<number, Candidate & { bySet: Map<number, SetReadings> }>()
  for (const row of rows) {
    if (row.withdrawnAt && row.withdrawnAt <= at) continue
    let candidate = byRevision.get(row.revisionId)
    if (!candidate) {
      const { slug, name, maker, deviceId, revisionId, revision } = row
      candidate = { slug, name, maker, deviceId, revisionId, revision, sets: [], setIds: [], bySet: new Map() }
      byRevision.set(row.revisionId, candidate)
    }
    let set = candidate.bySet.get(row.setId)
    if (!set) {
      const { session, unit, position, state } = row
      set = { session, unit, position, state, readings: [] }
      candidate.bySet.set(row.setId, set)
    }
    set.readings.push({ L: row.L, a: row.a, b: row.b })
  }

  // Rows come oldest revision first, so that a newer one with figures takes the older one's place. The order of slugs
  // is made here: the database's own may ignore hyphens.
  const newest = new Map<string, Candidate>()
  for (const { bySet, ...candidate } of byRevision.values()) {
    for (const [id, set] of bySet) {
      if (set.readings.length < METHOD.figures.leastReadings.value) continue
      candidate.sets.push(set)
      candidate.setIds.push(id)
    }
    const states = new Set(candidate.sets.map((set) => set.state))
    if (states.size === 2) newest.set(candidate.slug, candidate)
  }
  return [...newest.values()].sort((one, other) => (one.slug < other.slug ? -1 : 1))
}
