import { asc, count, desc, eq, inArray, type SQL } from 'drizzle-orm'
import type { Db } from '../client'
import { corrections, devices, replies } from '../schema'

export type CorrectionRecord = Awaited<ReturnType<typeof listCorrections>>[number]

/** Number of corrections there are. */
export async function countCorrections(db: Db): Promise<number> {
  const [row] = await db.select({ all: count() }).from(corrections)
  return row?.all ?? 0
}

/** Corrections with their device and the replies to them, newest first; of one day, the last noted first. */
export function listCorrections(db: Db, { limit, offset = 0 }: { limit: number; offset?: number }) {
  return withReplies(db, undefined, { limit, offset })
}

/** The corrections an edition puts right, newest first. */
export function listCorrectionsRightIn(db: Db, edition: number) {
  return withReplies(db, eq(corrections.rightIn, edition))
}

/** The corrections of what an edition printed wrong, newest first. */
export function listCorrectionsWrongIn(db: Db, edition: number) {
  return withReplies(db, eq(corrections.wrongIn, edition))
}

async function withReplies(db: Db, condition?: SQL, page?: { limit: number; offset: number }) {
  const query = db
    .select({
      id: corrections.id,
      slug: devices.slug,
      name: devices.name,
      notedOn: corrections.notedOn,
      figure: corrections.figure,
      note: corrections.note,
      wrongIn: corrections.wrongIn,
      rightIn: corrections.rightIn,
    })
    .from(corrections)
    .innerJoin(devices, eq(devices.id, corrections.deviceId))
    .where(condition)
    .orderBy(desc(corrections.notedOn), desc(corrections.id))
  const rows = page ? await query.limit(page.limit).offset(page.offset) : await query
  const ids = rows.map(({ id }) => id)
  const answers = await db
    .select()
    .from(replies)
    .where(inArray(replies.correctionId, ids))
    .orderBy(asc(replies.repliedOn), asc(replies.id))
  return rows.map((row) => ({ ...row, replies: answers.filter(({ correctionId }) => correctionId === row.id) }))
}
