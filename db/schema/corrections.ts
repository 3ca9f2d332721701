import { sql } from 'drizzle-orm'
import { check, date, index, integer, pgTable, text } from 'drizzle-orm/pg-core'
import { devices } from './devices'
import { editions } from './editions'

/** A public note that a published figure was wrong, and what was done. */
export const corrections = pgTable(
  'corrections',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    deviceId: integer('device_id')
      .notNull()
      .references(() => devices.id),
    notedOn: date('noted_on').notNull(),
    /** Which figure, in words. */
    figure: text().notNull(),
    note: text().notNull(),
    /** The edition that was wrong, and the one that puts it right; null: not released yet. */
    wrongIn: integer('wrong_in').references(() => editions.number),
    rightIn: integer('right_in').references(() => editions.number),
  },
  (t) => [
    check('corrections_put_right_later', sql`${t.rightIn} > ${t.wrongIn}`),
    check('corrections_note_said', sql`btrim(${t.note}) <> ''`),
    index('corrections_device_id_idx').on(t.deviceId, t.notedOn.desc()),
  ],
)
