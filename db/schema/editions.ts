import { sql } from 'drizzle-orm'
import { check, integer, jsonb, pgTable, text, timestamp, unique } from 'drizzle-orm/pg-core'
import type { Components } from '@/lib/method/figures'
import type { Edition } from '@/lib/method/types'

/** A released edition. The row exists from its release on and never changes (trigger); numbers have no gaps. */
export const editions = pgTable(
  'editions',
  {
    number: integer().primaryKey(),
    publishedAt: timestamp('published_at', { withTimezone: true }).notNull(),
    method: integer().notNull(),
    title: text().notNull(),
    /** What changed, in plain words. */
    note: text().notNull(),
    /** SHA-256 of the RFC 8785 canonical JSON of the document without its own sha256 field. */
    sha256: text().notNull(),
    /** The document as the API serves it, key order kept. */
    document: jsonb().$type<Edition>().notNull(),
    /** Pooled components of variance the doubts were computed from, standard deviations in L*, a*, b*. */
    components: jsonb().$type<{ page: Components; ink: Components }>().notNull(),
  },
  (t) => [
    unique('editions_sha256_key').on(t.sha256),
    check('editions_number_from_one', sql`${t.number} >= 1`),
    check('editions_sha256_form', sql`${t.sha256} ~ '^[0-9a-f]{64}$'`),
    check(
      'editions_document_agrees',
      sql`((${t.document} ->> 'number')::int, (${t.document} ->> 'method')::int, ${t.document} ->> 'sha256', (${t.document} ->> 'publishedAt')::timestamptz) is not distinct from (${t.number}, ${t.method}, ${t.sha256}, ${t.publishedAt})`,
    ),
  ],
)
