import { sql } from 'drizzle-orm'
import { check, doublePrecision, index, integer, pgTable, text, timestamp } from 'drizzle-orm/pg-core'
import { calibrationKind } from './enums'
import { instruments } from './instruments'

/** White tile or black trap read to set the instrument's scale. */
export const calibrations = pgTable(
  'calibrations',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    instrumentId: integer('instrument_id')
      .notNull()
      .references(() => instruments.id),
    kind: calibrationKind().notNull(),
    at: timestamp({ withTimezone: true }).notNull(),
    /** Serial of the white tile; null for a zero calibration. */
    tileSerial: text('tile_serial'),
    /** Luminance factor found before the scale was set, percent; null: the instrument does not tell. */
    yBeforePercent: doublePrecision('y_before_percent'),
    note: text(),
  },
  (t) => [
    check('calibrations_y_before_percent_range', sql`${t.yBeforePercent} between 0 and 120`),
    check('calibrations_white_names_its_tile', sql`(${t.kind} = 'white') = (${t.tileSerial} is not null)`),
    index('calibrations_instrument_id_at_idx').on(t.instrumentId, t.at.desc()),
  ],
)
