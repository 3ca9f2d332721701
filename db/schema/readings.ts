import { sql } from 'drizzle-orm'
import { check, doublePrecision, integer, pgTable, real, text, unique } from 'drizzle-orm/pg-core'
import { readingFlag } from './enums'
import { sets } from './sets'

/** One press of the instrument. Measured values never change and no row is removed (trigger); a flag may be set. */
export const readings = pgTable(
  'readings',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    setId: integer('set_id')
      .notNull()
      .references(() => sets.id),
    ordinal: integer().notNull(),
    /** CIELAB, D65, 10°, white 94.811, 100, 107.304. */
    lStar: doublePrecision('l_star').notNull(),
    aStar: doublePrecision('a_star').notNull(),
    bStar: doublePrecision('b_star').notNull(),
    /** CIE whiteness W10 as the instrument gave it; null: it gave none. */
    instrumentWhiteness: doublePrecision('instrument_whiteness'),
    /** Radiance factor, 0–1, 400–700 nm every 10 nm; null: the instrument stores none. */
    spectrum: real().array(),
    flag: readingFlag().notNull().default('none'),
    /** Why it is flagged, left out, or cleared again; null: never flagged. */
    flagReason: text('flag_reason'),
  },
  (t) => [
    unique('readings_set_id_ordinal_key').on(t.setId, t.ordinal),
    check(
      'readings_lab_range',
      sql`${t.lStar} between 0 and 100 and ${t.aStar} between -60 and 60 and ${t.bStar} between -60 and 60`,
    ),
    check('readings_instrument_whiteness_range', sql`${t.instrumentWhiteness} between -500 and 500`),
    check('readings_flag_with_reason', sql`${t.flag} = 'none' or ${t.flagReason} is not null`),
    check('readings_flag_reason_said', sql`btrim(${t.flagReason}) <> ''`),
    check(
      'readings_spectrum_form',
      sql`${t.spectrum} is null or (cardinality(${t.spectrum}) = 31 and array_position(${t.spectrum}, null) is null and 0 <= all(${t.spectrum}) and 2 >= all(${t.spectrum}))`,
    ),
  ],
)
