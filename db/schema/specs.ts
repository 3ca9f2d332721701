import { sql } from 'drizzle-orm'
import { check, date, doublePrecision, index, integer, pgTable, text } from 'drizzle-orm/pg-core'
import { stated } from './enums'
import { revisions } from './revisions'

/** The facts a spec row may hold. Yes-or-no facts use `stated` alone; the others have a number or a list beside it. */
export const SPEC_FIELDS = [
  'diagonal',
  'ppi',
  'weight',
  'pen',
  'colour',
  'frontLight',
  'water',
  'pageButtons',
  'onSale',
  'lending',
  'speech',
  'formats',
] as const
export type SpecField = (typeof SPEC_FIELDS)[number]

/** One fact of a revision as somebody stated it on a day; the newest counts. Older ones stay. */
export const specs = pgTable(
  'specs',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revisions.id),
    field: text().$type<SpecField>().notNull(),
    /** yes: has it, or the value beside. no: has it not. not-stated: nobody says; never treated as no. */
    stated: stated().notNull(),
    /** diagonal in inches, ppi in pixels per inch, weight in grams, water as second IEC 60529 digit; null otherwise. */
    value: doublePrecision(),
    /** Names of file formats; null for other fields. */
    list: text().array(),
    source: text().notNull(),
    statedOn: date('stated_on').notNull(),
  },
  (t) => [
    check(
      'specs_field_known',
      sql`${t.field} in ('diagonal', 'ppi', 'weight', 'pen', 'colour', 'frontLight', 'water', 'pageButtons', 'onSale', 'lending', 'speech', 'formats')`,
    ),
    check(
      'specs_value_where_number',
      sql`(${t.field} in ('diagonal', 'ppi', 'weight', 'water') and ${t.stated} = 'yes') = (${t.value} is not null)`,
    ),
    check('specs_list_where_formats', sql`(${t.field} = 'formats' and ${t.stated} = 'yes') = (${t.list} is not null)`),
    check('specs_value_range', sql`${t.value} between 0 and 5000`),
    index('specs_revision_id_field_idx').on(t.revisionId, t.field, t.statedOn.desc()),
  ],
)
