import { sql } from 'drizzle-orm'
import { check, doublePrecision, index, integer, pgTable, unique } from 'drizzle-orm/pg-core'
import { controlSamples } from './control-samples'
import { controlMoment } from './enums'
import { sessions } from './sessions'

/** Readings of a control at the start and the end of a session. Never changed, never removed (trigger). */
export const controlReadings = pgTable(
  'control_readings',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    controlSampleId: integer('control_sample_id')
      .notNull()
      .references(() => controlSamples.id),
    sessionId: integer('session_id')
      .notNull()
      .references(() => sessions.id),
    moment: controlMoment().notNull(),
    ordinal: integer().notNull(),
    /** CIELAB, D65, 10°. */
    lStar: doublePrecision('l_star').notNull(),
    aStar: doublePrecision('a_star').notNull(),
    bStar: doublePrecision('b_star').notNull(),
  },
  (t) => [
    unique('control_readings_order_key').on(t.sessionId, t.controlSampleId, t.moment, t.ordinal),
    check(
      'control_readings_lab_range',
      sql`${t.lStar} between 0 and 110 and ${t.aStar} between -60 and 60 and ${t.bStar} between -60 and 60`,
    ),
    index('control_readings_control_sample_id_idx').on(t.controlSampleId, t.sessionId),
  ],
)
