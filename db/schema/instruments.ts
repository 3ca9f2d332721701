import { sql } from 'drizzle-orm'
import { boolean, check, date, doublePrecision, integer, pgTable, text, unique } from 'drizzle-orm/pg-core'

/** A spectrophotometer of the bench. */
export const instruments = pgTable(
  'instruments',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    name: text().notNull(),
    serial: text().notNull(),
    certificate: text().notNull(),
    certifiedOn: date('certified_on').notNull(),
    /** Last service; null: none yet. */
    servicedOn: date('serviced_on'),
    /** Standard uncertainty (k = 1) of calibration and certificate, in L*, a*, b*. */
    certificateUL: doublePrecision('certificate_u_l').notNull(),
    certificateUA: doublePrecision('certificate_u_a').notNull(),
    certificateUB: doublePrecision('certificate_u_b').notNull(),
    storesSpectra: boolean('stores_spectra').notNull(),
  },
  (t) => [
    unique('instruments_serial_key').on(t.serial),
    check(
      'instruments_certificate_u_range',
      sql`${t.certificateUL} between 0 and 5 and ${t.certificateUA} between 0 and 5 and ${t.certificateUB} between 0 and 5`,
    ),
  ],
)
