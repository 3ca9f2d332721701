import { date, integer, pgTable, text, unique } from 'drizzle-orm/pg-core'
import { devices } from './devices'

/** What the maker changed under one model name: another panel, another batch. Pages of two revisions may differ. */
export const revisions = pgTable(
  'revisions',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    deviceId: integer('device_id')
      .notNull()
      .references(() => devices.id),
    /** As the maker or the team names it. */
    name: text().notNull(),
    /** First seen on sale by the team; null: not known. */
    since: date(),
    note: text(),
  },
  (t) => [unique('revisions_device_id_name_key').on(t.deviceId, t.name)],
)
