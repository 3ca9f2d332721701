import { sql } from 'drizzle-orm'
import { check, integer, pgTable, text, unique } from 'drizzle-orm/pg-core'

/** Those who make reading devices. */
export const makers = pgTable(
  'makers',
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    slug: text().notNull(),
    name: text().notNull(),
  },
  (t) => [unique('makers_slug_key').on(t.slug), check('makers_slug_form', sql`${t.slug} ~ '^[a-z0-9]+(-[a-z0-9]+)*$'`)],
)
