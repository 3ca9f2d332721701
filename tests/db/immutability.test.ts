import { eq, sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import type { Db } from '@/db/client'
import { readings, sets } from '@/db/schema'
import { createSeededDatabase, refusalOf, rollingBack } from '@/tests/fixtures/db'
import { insertSet } from '@/tests/fixtures/db-rows'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
beforeAll(async () => {
  seeded = await createSeededDatabase()
})
afterAll(() => seeded.drop())

/** A set that no edition rests on yet, of a unit and in a session the demo has. */
async function insertUnreleasedSet(tx: Db) {
  const [known] = await tx.select({ sessionId: sets.sessionId, unitId: sets.unitId }).from(sets).limit(1)
  return insertSet(tx, { ...known!, state: 'page', position: 'lower-outer' }, [70, 70.1, 70.2, 70.1, 70])
}

/** What the owner of the database types, bare SQL; and the rule that refuses it. */
function refused(rows: [name: string, statement: string][]) {
  test.each(rows)('%s refuses: %s', async (name, statement) => {
    await rollingBack(seeded.db, async (tx) => {
      expect(await refusalOf(tx, (inner) => inner.execute(sql.raw(statement)))).toBe(name)
    })
  })
}

const firstReading = '(select min(id) from readings)'

describe('readings', () => {
  refused([
    ['readings_immutable', `update readings set l_star = l_star + 0.01 where id = ${firstReading}`],
    ['readings_immutable', `update readings set a_star = 0 where id = ${firstReading}`],
    ['readings_immutable', `update readings set b_star = 0 where id = ${firstReading}`],
    ['readings_immutable', `update readings set spectrum = null where spectrum is not null`],
    ['readings_immutable', `update readings set instrument_whiteness = 1 where id = ${firstReading}`],
    ['readings_immutable', `update readings set ordinal = 99 where id = ${firstReading}`],
    ['readings_immutable', `update readings set set_id = (select max(id) from sets) where id = ${firstReading}`],
    ['readings_immutable', `delete from readings where id = ${firstReading}`],
    ['readings_immutable', 'delete from readings where false'],
    ['readings_immutable', 'truncate readings'],
    [
      'readings_released',
      `insert into readings (set_id, ordinal, l_star, a_star, b_star) select set_id, 99, 50, 0, 0 from readings where id = ${firstReading}`,
    ],
    ['readings_released', `update readings set flag = 'left-out', flag_reason = 'too dark' where id = ${firstReading}`],
  ])

  test('a flag may be set before a release, each time with a reason of its own', async () => {
    await rollingBack(seeded.db, async (tx) => {
      const { readingIds } = await insertUnreleasedSet(tx)
      const update = (db: Db, fields: Partial<typeof readings.$inferInsert>) =>
        db.update(readings).set(fields).where(eq(readings.id, readingIds[0]!))
      await update(tx, { flag: 'flagged', flagReason: 'stands out by Grubbs’ test' })
      for (const fields of [
        { flag: 'left-out' as const },
        { flag: 'none' as const },
        { flag: 'none' as const, flagReason: null },
      ]) {
        expect(await refusalOf(tx, (inner) => update(inner, fields))).toBe('readings_flag_change_with_reason')
      }
      await update(tx, { flag: 'left-out', flagReason: 'the foot was not flat' })
      await update(tx, { flag: 'none', flagReason: 'the foot was flat after all' })
      const [row] = await tx.select().from(readings).where(eq(readings.id, readingIds[0]!))
      expect(row).toMatchObject({ lStar: 70, flag: 'none', flagReason: 'the foot was flat after all' })
    })
  })
})

describe('readings of controls', () => {
  refused([
    ['control_readings_immutable', 'update control_readings set l_star = 95'],
    ['control_readings_immutable', 'delete from control_readings'],
    ['control_readings_immutable', 'truncate control_readings'],
    [
      'control_readings_released',
      'insert into control_readings (control_sample_id, session_id, moment, ordinal, l_star, a_star, b_star) select control_sample_id, session_id, moment, 99, 50, 0, 0 from control_readings limit 1',
    ],
  ])
})

describe('sets', () => {
  refused([
    ['sets_immutable', `update sets set position = 'centre' where position = 'upper-outer'`],
    ['sets_immutable', 'update sets set light_off = false'],
    ['sets_immutable', `update sets set specular = 'excluded'`],
    ['sets_immutable', `update sets set session_id = (select max(id) from sessions)`],
    ['sets_immutable', 'delete from sets'],
    [
      'sets_withdrawn_for_good',
      'update sets set withdrawn_at = null, withdrawn_reason = null where withdrawn_at is not null',
    ],
    ['sets_withdrawn_for_good', `update sets set withdrawn_reason = 'another' where withdrawn_at is not null`],
  ])

  test('one that a released edition rests on may still be withdrawn, with its reason', async () => {
    await rollingBack(seeded.db, async (tx) => {
      const released = sql`id in (select unnest(set_ids) from edition_entries where edition = 3)`
      const rows = await tx
        .update(sets)
        .set({ withdrawnAt: new Date('2026-11-25T10:00:00Z'), withdrawnReason: 'read through a film' })
        .where(released)
        .returning({ id: sets.id })
      expect(rows.length).toBeGreaterThan(100)
    })
  })
})

describe('what a released edition rests on', () => {
  refused([
    ['sessions_released', `update sessions set illuminant = 'D50'`],
    ['sessions_released', 'update sessions set aperture_mm = 4'],
    ['sessions_released', `update sessions set instrument_id = (select max(id) from instruments)`],
    ['units_released', 'update units set revision_id = (select max(id) from revisions)'],
    ['units_released', `update units set serial = serial || 'x'`],
  ])

  test('the whole bench cannot be emptied from its root', async () => {
    await rollingBack(seeded.db, async (tx) => {
      const refusal = await refusalOf(tx, (inner) => inner.execute(sql`truncate makers, instruments cascade`))
      expect(refusal).toMatch(/_immutable$/)
    })
  })

  test('a session’s note and a unit’s condition may be added to', async () => {
    await rollingBack(seeded.db, async (tx) => {
      await tx.execute(sql`update sessions set note = 'the heating was off'`)
      await tx.execute(sql`update units set condition = 'a scratch at the lower edge'`)
    })
  })
})

describe('editions', () => {
  refused([
    ['editions_immutable', `update editions set note = 'better'`],
    ['editions_immutable', `update editions set document = jsonb_set(document, '{devices,0,page,L}', '99')`],
    ['editions_immutable', 'update editions set number = 4 where number = 3'],
    ['editions_immutable', 'delete from editions where number = 3'],
    ['editions_immutable', 'delete from editions where false'],
    ['edition_entries_immutable', `update edition_entries set set_ids = '{1}'`],
    ['edition_entries_immutable', `update edition_entries set device = device || '{"units": 9}'`],
    ['edition_entries_immutable', 'delete from edition_entries'],
    ['edition_entries_immutable', 'truncate edition_entries'],
  ])

  // PostgreSQL refuses to empty a table others point at, before any trigger; with them all at once the trigger speaks.
  refused([
    ['editions_immutable', 'truncate editions, edition_entries, corrections, replies, edition_datasets, edition_files'],
  ])

  /** Statements that add a made-up edition like the third, changed by JSON. */
  const edition = (changes: string, number = 4, day = '2026-12-01') => {
    const hash = 'b'.repeat(64)
    const own = `jsonb_build_object('number', ${number}, 'publishedAt', '${day}T00:00:00Z', 'sha256', '${hash}')`
    return `insert into editions (number, published_at, method, title, note, sha256, document, components) select ${number}, '${day}T00:00:00Z', method, title, note, '${hash}', document || ${own} || ${changes}, components from editions where number = 3`
  }
  const entry = (changes: string, of = 'edition = 3', slug = 'slug') =>
    `insert into edition_entries (edition, revision_id, slug, device, set_ids) select 4, revision_id, ${slug}, device || ${changes}, set_ids from edition_entries where ${of}`

  refused([
    ['editions_number_without_gaps', edition(`'{}'`, 5)],
    ['editions_number_without_gaps', edition(`'{}'`, 3)],
    ['editions_released_in_order', edition(`'{}'`, 4, '2026-11-01')],
    ['editions_document_agrees', edition(`'{"number": 7}'`)],
    ['editions_document_agrees', edition(`'{"sha256": null}'`)],
    ['editions_document_agrees', edition(`'{"publishedAt": "2026-11-30T00:00:00Z"}'`)],
    ['editions_whole', `${edition(`'{}'`)}; set constraints all immediate`],
    [
      'editions_whole',
      `${edition(`'{}'`)}; ${entry(`'{}'`, `edition = 3 and slug <> 'ostler-plain-7'`)}; set constraints all immediate`,
    ],
    ['edition_entries_as_printed', `${edition(`'{}'`)}; ${entry(`'{"units": 9}'`)}`],
    ['edition_entries_slug_of_device', `${edition(`'{}'`)}; ${entry(`'{}'`, 'edition = 3', `slug || '-2'`)}`],
    [
      'edition_entries_own_sets',
      `${edition(`'{}'`)}; insert into edition_entries (edition, revision_id, slug, device, set_ids) select 4, revision_id, slug, device, (select max(set_ids) from edition_entries) from edition_entries where edition = 3 and slug = 'ostler-plain-7'`,
    ],
    ['edition_entries_pkey', 'insert into edition_entries select * from edition_entries where edition = 3 limit 1'],
  ])

  test('an edition whose entries are the devices it prints is kept', async () => {
    await rollingBack(seeded.db, async (tx) => {
      await tx.execute(sql.raw(`${edition(`'{}'`)}; ${entry(`'{}'`)}; set constraints all immediate`))
    })
  })
})
