import { sql } from 'drizzle-orm'
import { check, doublePrecision, index, integer, pgTable, text, timestamp, unique } from 'drizzle-orm/pg-core'
import { illuminant, observer, specularMode, uvMode } from './enums'
import { instruments } from './instruments'

/** A morning or afternoon at the bench with one instrument; its settings are pinned as they were. */
export const sessions = pgTable(
  'sessions',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    /** The name the edition document calls it by, such as "2026-03-12-a". */
    name: text().notNull(),
    instrumentId: integer('instrument_id')
      .notNull()
      .references(() => instruments.id),
    /** Role or initials of who measured. */
    operator: text().notNull(),
    startedAt: timestamp('started_at', { withTimezone: true }).notNull(),
    endedAt: timestamp('ended_at', { withTimezone: true }).notNull(),
    temperatureCelsius: doublePrecision('temperature_celsius').notNull(),
    /** CIE geometry, such as "d/8". */
    geometry: text().notNull(),
    specular: specularMode().notNull(),
    illuminant: illuminant().notNull(),
    /** Degrees. */
    observer: observer().notNull(),
    apertureMm: doublePrecision('aperture_mm').notNull(),
    uv: uvMode().notNull(),
    note: text(),
  },
  (t) => [
    unique('sessions_name_key').on(t.name),
    check('sessions_ends_after_start', sql`${t.endedAt} > ${t.startedAt}`),
    check('sessions_temperature_celsius_range', sql`${t.temperatureCelsius} between 10 and 40`),
    check('sessions_aperture_mm_range', sql`${t.apertureMm} between 1 and 30`),
    index('sessions_started_at_idx').on(t.startedAt),
  ],
)
