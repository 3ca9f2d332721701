import { and, asc, count, eq, ne, sql } from 'drizzle-orm'
import type { Lab } from '@/lib/method/types'
import type { Db } from '../client'
import { editionEntries, readings, sessions, sets, units } from '../schema'

/** A set that an edition's figures rest on, with how many of its readings count. */
export type CountedSet = {
  slug: string
  unit: string
  set: number
  session: string
  state: 'page' | 'ink'
  readings: number
}

/** The sets of an edition, by device; empty where there is no such edition. */
export async function listCountedSets(db: Db, edition: number): Promise<CountedSet[]> {
  return db
    .select({
      slug: editionEntries.slug,
      unit: units.serial,
      set: sets.id,
      session: sessions.name,
      state: sets.state,
      readings: count(readings.id),
    })
    .from(editionEntries)
    .innerJoin(sets, sql`${sets.id} = any(${editionEntries.setIds})`)
    .innerJoin(sessions, eq(sessions.id, sets.sessionId))
    .innerJoin(units, eq(units.id, sets.unitId))
    .innerJoin(readings, and(eq(readings.setId, sets.id), ne(readings.flag, 'left-out')))
    .where(eq(editionEntries.edition, edition))
    .groupBy(editionEntries.slug, units.serial, sets.id, sessions.name, sets.state)
    .orderBy(asc(editionEntries.slug), asc(sets.id))
}

/** Two sets of one unit, place and session: what a worked example starts from. */
export type ExampleSets = { unit: string; position: string; session: string; page: Lab[]; ink: Lab[] }

/**
 * The first page set of a device in an edition and the ink set read at the same place in the same session (failing
 * that, the device's first ink set); readings that count, in their order. Null where the edition has no such device.
 */
export async function findExampleSets(db: Db, edition: number, slug: string): Promise<ExampleSets | null> {
  const rows = await db
    .select({
      set: sets.id,
      unit: units.serial,
      position: sets.position,
      session: sessions.name,
      state: sets.state,
      L: readings.lStar,
      a: readings.aStar,
      b: readings.bStar,
    })
    .from(editionEntries)
    .innerJoin(sets, sql`${sets.id} = any(${editionEntries.setIds})`)
    .innerJoin(sessions, eq(sessions.id, sets.sessionId))
    .innerJoin(units, eq(units.id, sets.unitId))
    .innerJoin(readings, and(eq(readings.setId, sets.id), ne(readings.flag, 'left-out')))
    .where(and(eq(editionEntries.edition, edition), eq(editionEntries.slug, slug)))
    .orderBy(asc(sets.id), asc(readings.ordinal))
  const first = rows.find(({ state }) => state === 'page')
  if (!first) return null
  const dark =
    rows.find(
      ({ state, unit, position, session }) =>
        state === 'ink' && unit === first.unit && position === first.position && session === first.session,
    ) ?? rows.find(({ state }) => state === 'ink')
  if (!dark) return null
  const { unit, position, session } = first
  const readingsOf = (set: number) => rows.filter((row) => row.set === set).map(({ L, a, b }) => ({ L, a, b }))
  return { unit, position, session, page: readingsOf(first.set), ink: readingsOf(dark.set) }
}
