import { sql } from 'drizzle-orm'
import { check, date, doublePrecision, index, integer, pgTable } from 'drizzle-orm/pg-core'
import { units } from './units'

/** The front light of a unit, by luminance meter on a white page in a dark room. */
export const frontLightMeasurements = pgTable(
  'front_light_measurements',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    unitId: integer('unit_id')
      .notNull()
      .references(() => units.id),
    measuredOn: date('measured_on').notNull(),
    /** cd/m² at the highest and the lowest setting that is not off. */
    maxCdM2: doublePrecision('max_cd_m2').notNull(),
    minCdM2: doublePrecision('min_cd_m2').notNull(),
    /** Darkest over lightest of nine places, percent. */
    evennessPercent: doublePrecision('evenness_percent').notNull(),
    /** Correlated colour temperatures at the coolest and the warmest setting, kelvin; equal where it is fixed. */
    coolestKelvin: doublePrecision('coolest_kelvin').notNull(),
    warmestKelvin: doublePrecision('warmest_kelvin').notNull(),
  },
  (t) => [
    check('front_light_cd_m2_range', sql`${t.minCdM2} > 0 and ${t.maxCdM2} between ${t.minCdM2} and 2000`),
    check('front_light_evenness_percent_range', sql`${t.evennessPercent} between 0 and 100`),
    check(
      'front_light_kelvin_range',
      sql`${t.warmestKelvin} between 1000 and 20000 and ${t.coolestKelvin} between ${t.warmestKelvin} and 20000`,
    ),
    index('front_light_measurements_unit_id_idx').on(t.unitId, t.measuredOn.desc()),
  ],
)
