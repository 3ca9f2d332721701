import { desc, eq, max, sql } from 'drizzle-orm'
import { unionAll } from 'drizzle-orm/pg-core'
import type { Changes } from '@/lib/public-pages'
import type { Db } from '../client'
import { corrections, devices, editions, prices, replies, revisions, sessions, sets, units } from '../schema'

/** The dates a site map can vouch for. */
export async function findPageChanges(db: Db): Promise<Changes> {
  const released = await db
    .select({ number: editions.number, publishedAt: editions.publishedAt })
    .from(editions)
    .orderBy(desc(editions.number))
  const moments = await listMoments(db)
  const [corrected] = await db
    .select({ at: max(sql<string>`greatest(${corrections.notedOn}, ${replies.repliedOn})`) })
    .from(corrections)
    .leftJoin(replies, eq(replies.correctionId, corrections.id))
  return {
    editions: released.map(({ number, publishedAt }) => ({ number, publishedAt: publishedAt.toISOString() })),
    devices: new Map(moments.map(({ slug, at }) => [slug, new Date(at).toISOString()])),
    corrections: corrected?.at ? new Date(corrected.at).toISOString() : null,
  }
}

/** For each device the newest moment of anything its page shows. Days count from midnight, UTC. */
function listMoments(db: Db) {
  const day = (column: typeof prices.seenOn | typeof corrections.notedOn | typeof replies.repliedOn) =>
    sql<string>`(${column}::timestamp at time zone 'UTC')`.as('moment')
  const all = unionAll(
    db.select({ id: prices.deviceId, moment: day(prices.seenOn) }).from(prices),
    db.select({ id: corrections.deviceId, moment: day(corrections.notedOn) }).from(corrections),
    db
      .select({ id: corrections.deviceId, moment: day(replies.repliedOn) })
      .from(replies)
      .innerJoin(corrections, eq(corrections.id, replies.correctionId)),
    db
      .select({
        id: revisions.deviceId,
        moment: sql<string>`greatest(${sessions.endedAt}, ${sets.withdrawnAt})`.as('moment'),
      })
      .from(sets)
      .innerJoin(sessions, eq(sessions.id, sets.sessionId))
      .innerJoin(units, eq(units.id, sets.unitId))
      .innerJoin(revisions, eq(revisions.id, units.revisionId)),
  ).as('all_moments')
  return db
    .select({ slug: devices.slug, at: sql<string>`max(${all.moment})` })
    .from(all)
    .innerJoin(devices, eq(devices.id, all.id))
    .groupBy(devices.slug)
}
