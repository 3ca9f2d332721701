import { sql } from 'drizzle-orm'
import { check, date, index, integer, pgTable, text } from 'drizzle-orm/pg-core'
import { corrections } from './corrections'

/** A public answer to a correction or a figure: of a maker, an owner, or the team. */
export const replies = pgTable(
  'replies',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    correctionId: integer('correction_id')
      .notNull()
      .references(() => corrections.id),
    repliedOn: date('replied_on').notNull(),
    /** Who speaks, as a role. */
    from: text().notNull(),
    note: text().notNull(),
  },
  (t) => [
    check('replies_note_said', sql`btrim(${t.note}) <> ''`),
    index('replies_correction_id_idx').on(t.correctionId),
  ],
)
