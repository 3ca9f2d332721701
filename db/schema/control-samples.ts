import { integer, pgTable, text, unique } from 'drizzle-orm/pg-core'
import { controlKind } from './enums'

/** What is read in every session: a tile for stability, a chart white, and a numbered paper for meaning. */
export const controlSamples = pgTable(
  'control_samples',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    kind: controlKind().notNull(),
    name: text().notNull(),
    serial: text().notNull(),
    /** Backing, storage, brighteners: what one must know to read it again. */
    note: text().notNull(),
  },
  (t) => [unique('control_samples_serial_key').on(t.serial)],
)
