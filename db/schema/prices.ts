import { sql } from 'drizzle-orm'
import { check, date, index, integer, pgTable, text } from 'drizzle-orm/pg-core'
import { devices } from './devices'

/** A price as the team saw it on a day, tax included. Never converted to another currency. */
export const prices = pgTable(
  'prices',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    deviceId: integer('device_id')
      .notNull()
      .references(() => devices.id),
    /** Minor units, such as pence. */
    amountMinor: integer('amount_minor').notNull(),
    /** ISO 4217. */
    currency: text().notNull(),
    seenOn: date('seen_on').notNull(),
    /** What kind of seller, in words. */
    seller: text().notNull(),
  },
  (t) => [
    check('prices_amount_minor_range', sql`${t.amountMinor} between 1 and 100000000`),
    check('prices_currency_form', sql`${t.currency} ~ '^[A-Z]{3}$'`),
    index('prices_device_id_seen_on_idx').on(t.deviceId, t.seenOn.desc()),
  ],
)
