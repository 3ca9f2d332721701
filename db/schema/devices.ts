import { sql } from 'drizzle-orm'
import { check, integer, pgTable, text, unique } from 'drizzle-orm/pg-core'
import { makers } from './makers'

/** A model as a shop sells it; what is measured is a unit of one of its revisions. */
export const devices = pgTable(
  'devices',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    slug: text().notNull(),
    makerId: integer('maker_id')
      .notNull()
      .references(() => makers.id),
    name: text().notNull(),
    /** The editor's plain words on the device; null: none written yet. */
    note: text(),
  },
  (t) => [
    unique('devices_slug_key').on(t.slug),
    check('devices_slug_form', sql`${t.slug} ~ '^[a-z0-9]+(-[a-z0-9]+)*$'`),
  ],
)
