import { sql } from 'drizzle-orm'
import { check, index, integer, jsonb, pgTable, primaryKey, text } from 'drizzle-orm/pg-core'
import type { EditionDevice } from '@/lib/method/types'
import { editions } from './editions'
import { revisions } from './revisions'

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
    check('edition_entries_slug_of_device', sql`${t.device} ->> 'slug' is not distinct from ${t.slug}`),
    // Which released editions rest on a set: asked by the triggers at every change of a set and its readings.
    index('edition_entries_set_ids_idx').using('gin', t.setIds),
  ],
)
