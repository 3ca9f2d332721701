import { date, integer, pgTable, text, unique } from 'drizzle-orm/pg-core'
import { obtained } from './enums'
import { revisions } from './revisions'

/** One piece of hardware on the bench. */
export const units = pgTable(
  'units',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revisions.id),
    serial: text().notNull(),
    /** Production batch; null: not printed on the unit. */
    batch: text(),
    firmware: text().notNull(),
    obtained: obtained().notNull(),
    /** From whom: a shop for a purchase, the lender for a loan. */
    obtainedFrom: text('obtained_from').notNull(),
    obtainedOn: date('obtained_on').notNull(),
    condition: text().notNull(),
  },
  (t) => [unique('units_serial_key').on(t.serial)],
)
