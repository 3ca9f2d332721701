import { sql } from 'drizzle-orm'
import { check, integer, jsonb, pgTable, primaryKey, text, timestamp, unique } from 'drizzle-orm/pg-core'
import type { Components } from '@/lib/method/figures'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { revisions } from './revisions'

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
  ],
)

/** What an edition froze of one device, and the sets it was computed from. Never changes (trigger). */
export const editionEntries = pgTable(
  'edition_entries',
  {
    edition: integer()
      .notNull()
      .references(() => editions.number),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revisions.id),
    slug: text().notNull(),
    /** Figures, doubts and session shares as in the document. */
    device: jsonb().$type<EditionDevice>().notNull(),
    setIds: integer('set_ids').array().notNull(),
  },
  (t) => [
    primaryKey({ name: 'edition_entries_pkey', columns: [t.edition, t.slug] }),
    check('edition_entries_from_sets', sql`cardinality(${t.setIds}) > 0`),
  ],
)
