import { and, asc, desc, eq, inArray, max, min } from 'drizzle-orm'
import { alias } from 'drizzle-orm/pg-core'
import type { Db } from '../client'
import { corrections, devices, editionEntries, editions, replies } from '../schema'

/**
 * The newest editions, corrections and devices, each newest first. A device is new with the first edition that has it.
 * @param limit at most this many of each kind
 */
export async function listNews(db: Db, limit: number) {
  return {
    editions: await db
      .select({
        number: editions.number,
        title: editions.title,
        note: editions.note,
        publishedAt: editions.publishedAt,
      })
      .from(editions)
      .orderBy(desc(editions.number))
      .limit(limit),
    corrections: await listCorrected(db, limit),
    devices: await listFirstEntries(db, limit),
  }
}

async function listCorrected(db: Db, limit: number) {
  const right = alias(editions, 'right_edition')
  const rows = await db
    .select({
      id: corrections.id,
      slug: devices.slug,
      device: devices.name,
      figure: corrections.figure,
      note: corrections.note,
      notedOn: corrections.notedOn,
      /** The edition that puts it right, and when it came out; null: not released yet. */
      rightIn: corrections.rightIn,
      rightAt: right.publishedAt,
    })
    .from(corrections)
    .innerJoin(devices, eq(devices.id, corrections.deviceId))
    .leftJoin(right, eq(right.number, corrections.rightIn))
    .orderBy(desc(corrections.notedOn), desc(corrections.id))
    .limit(limit)
  const answers = await db
    .select({ correctionId: replies.correctionId, repliedOn: replies.repliedOn })
    .from(replies)
    .where(
      inArray(
        replies.correctionId,
        rows.map((row) => row.id),
      ),
    )
    .orderBy(asc(replies.repliedOn))
  return rows.map((row) => ({
    ...row,
    repliedOn: answers.filter((answer) => answer.correctionId === row.id).map((answer) => answer.repliedOn),
  }))
}

async function listFirstEntries(db: Db, limit: number) {
  const first = db
    .select({ slug: editionEntries.slug, edition: min(editionEntries.edition).as('first_edition') })
    .from(editionEntries)
    .groupBy(editionEntries.slug)
    .as('first')
  const newest = db.select({ number: max(editions.number) }).from(editions)
  const now = alias(editionEntries, 'now')
  const rows = await db
    .select({
      edition: editions.number,
      publishedAt: editions.publishedAt,
      entry: editionEntries.device,
      /** Null where the newest edition no longer has it. */
      inNewest: now.slug,
    })
    .from(first)
    .innerJoin(editions, eq(editions.number, first.edition))
    .innerJoin(editionEntries, and(eq(editionEntries.slug, first.slug), eq(editionEntries.edition, first.edition)))
    .leftJoin(now, and(eq(now.slug, first.slug), eq(now.edition, newest)))
    .orderBy(desc(editions.number), asc(first.slug))
    .limit(limit)
  return rows.map(({ inNewest, entry, ...row }) => ({
    ...row,
    slug: entry.slug,
    name: entry.name,
    maker: entry.maker,
    units: entry.units,
    provisional: entry.provisional,
    listed: inNewest !== null,
  }))
}
