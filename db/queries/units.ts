import { count, desc } from 'drizzle-orm'
import type { Db } from '../client'
import { units } from '../schema'

/** How many units came to the bench in which way and from whom, over everything ever read; the most first. */
export function countObtained(db: Db) {
  return db
    .select({ obtained: units.obtained, from: units.obtainedFrom, units: count() })
    .from(units)
    .groupBy(units.obtained, units.obtainedFrom)
    .orderBy(desc(count()), units.obtainedFrom)
}
