import { count, desc, eq, max, sql } from 'drizzle-orm'
import type { Edition } from '@/lib/method/types'
import type { Db } from '../client'
import { editions } from '../schema'

/** The number of the newest released edition; null while there is none. */
export async function findLatestEditionNumber(db: Db): Promise<number | null> {
  const [row] = await db.select({ number: max(editions.number) }).from(editions)
  return row?.number ?? null
}

/** The released edition of this number, as it was frozen; null where there is none. */
export async function findEdition(db: Db, number: number): Promise<Edition | null> {
  const [row] = await db.select({ document: editions.document }).from(editions).where(eq(editions.number, number))
  return row?.document ?? null
}

/** The newest released edition; null while there is none. */
export async function findLatestEdition(db: Db): Promise<Edition | null> {
  const [row] = await db.select({ document: editions.document }).from(editions).orderBy(desc(editions.number)).limit(1)
  return row?.document ?? null
}

/** Released editions, newest first, without their documents. */
export function listEditions(db: Db) {
  return db
    .select({
      number: editions.number,
      publishedAt: editions.publishedAt,
      sha256: editions.sha256,
      title: editions.title,
      note: editions.note,
    })
    .from(editions)
    .orderBy(desc(editions.number))
}

/** Pooled components of variance of an edition, standard deviations; null where there is no such edition. */
export async function findComponents(db: Db, number: number) {
  const [row] = await db.select({ components: editions.components }).from(editions).where(eq(editions.number, number))
  return row?.components ?? null
}

/** How many editions have been released. */
export async function countEditions(db: Db): Promise<number> {
  const [row] = await db.select({ all: count() }).from(editions)
  return row?.all ?? 0
}

/** Some released editions, newest first, with the number of their devices and without their documents. */
export function listEditionSummaries(db: Db, { limit, offset = 0 }: { limit: number; offset?: number }) {
  return db
    .select({
      number: editions.number,
      publishedAt: editions.publishedAt,
      sha256: editions.sha256,
      title: editions.title,
      note: editions.note,
      devices: sql<number>`jsonb_array_length(${editions.document} -> 'devices')`,
    })
    .from(editions)
    .orderBy(desc(editions.number))
    .limit(limit)
    .offset(offset)
}

/** What the team wrote at the release of an edition; null where there is none. */
export async function findEditionWords(db: Db, number: number): Promise<{ title: string; note: string } | null> {
  const [row] = await db
    .select({ title: editions.title, note: editions.note })
    .from(editions)
    .where(eq(editions.number, number))
  return row ?? null
}
