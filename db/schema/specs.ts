import { sql } from 'drizzle-orm'
import { check, date, doublePrecision, integer, pgTable, text, unique } from 'drizzle-orm/pg-core'
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
    check('specs_diagonal_range', sql`${t.field} <> 'diagonal' or ${t.value} between 1 and 50`),
    check('specs_ppi_range', sql`${t.field} <> 'ppi' or ${t.value} between 10 and 2000`),
    check('specs_weight_range', sql`${t.field} <> 'weight' or ${t.value} between 10 and 5000`),
    check('specs_water_digit', sql`${t.field} <> 'water' or ${t.value} in (0, 1, 2, 3, 4, 5, 6, 7, 8, 9)`),
    check(
      'specs_list_filled',
      sql`${t.list} is null or (cardinality(${t.list}) > 0 and array_position(${t.list}, null) is null)`,
    ),
    check('specs_source_said', sql`btrim(${t.source}) <> ''`),
    // The newest statement of a field counts, so two of one day would leave it open which.
    unique('specs_statement_key').on(t.revisionId, t.field, t.statedOn),
  ],
)
