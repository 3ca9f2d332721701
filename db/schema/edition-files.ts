import { sql } from 'drizzle-orm'
import { check, customType, date, integer, jsonb, pgTable, primaryKey, text } from 'drizzle-orm/pg-core'
import { editions } from './editions'

const bytea = customType<{ data: Uint8Array<ArrayBuffer>; driverData: Uint8Array }>({
  dataType: () => 'bytea',
  fromDriver: (value) => new Uint8Array(value),
})

/** What an edition's data set says of itself as a whole. Never changes (trigger). */
export const editionDatasets = pgTable('edition_datasets', {
  edition: integer()
    .primaryKey()
    .references(() => editions.number),
  /** First and last day of the sessions it rests on. */
  measuredFrom: date('measured_from').notNull(),
  measuredTo: date('measured_to').notNull(),
  /** How many rows each table has, by its name. */
  rows: jsonb().$type<Record<string, number>>().notNull(),
})

/** The files of an edition's data set, byte for byte as they were released. Never change (trigger). */
export const editionFiles = pgTable(
  'edition_files',
  {
    edition: integer()
      .notNull()
      .references(() => editionDatasets.edition),
    /** The order in which the checksums name them. */
    place: integer().notNull(),
    name: text().notNull(),
    /** Content-Type. */
    type: text().notNull(),
    /** SHA-256 of the bytes, hex. */
    sha256: text().notNull(),
    bytes: bytea().notNull(),
  },
  (t) => [
    primaryKey({ name: 'edition_files_pkey', columns: [t.edition, t.name] }),
    check('edition_files_sha256_of_bytes', sql`${t.sha256} = encode(sha256(${t.bytes}), 'hex')`),
    check('edition_files_name_is_a_file', sql`${t.name} ~ '^[A-Za-z0-9][A-Za-z0-9.-]*$'`),
  ],
)
