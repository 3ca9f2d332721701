import { sql } from 'drizzle-orm'
import { boolean, check, index, integer, pgTable, text, timestamp, unique } from 'drizzle-orm/pg-core'
import { specularMode, state } from './enums'
import { sessions } from './sessions'
import { units } from './units'

/** Repeated readings of one unit, one position, one state, in one session. */
export const sets = pgTable(
  'sets',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    sessionId: integer('session_id')
      .notNull()
      .references(() => sessions.id),
    unitId: integer('unit_id')
      .notNull()
      .references(() => units.id),
    /** Where on the page: centre, upper-outer, lower-inner. */
    position: text().notNull(),
    state: state().notNull(),
    specular: specularMode().notNull(),
    /** Front light off, as the tester confirmed. */
    lightOff: boolean('light_off').notNull(),
    /** What was shown: test page and theme. */
    shown: text().notNull(),
    /** When it was found not to count; null: it counts. A set is never removed. */
    withdrawnAt: timestamp('withdrawn_at', { withTimezone: true }),
    withdrawnReason: text('withdrawn_reason'),
  },
  (t) => [
    check('sets_withdrawn_with_reason', sql`(${t.withdrawnAt} is null) = (${t.withdrawnReason} is null)`),
    check('sets_withdrawn_reason_said', sql`btrim(${t.withdrawnReason}) <> ''`),
    check('sets_position_said', sql`btrim(${t.position}) <> ''`),
    check('sets_shown_said', sql`btrim(${t.shown}) <> ''`),
    // More readings of the same place in the same session belong to the same set.
    unique('sets_place_key').on(t.sessionId, t.unitId, t.position, t.state, t.specular),
    index('sets_unit_id_idx').on(t.unitId, t.state),
  ],
)
