import type { Edition } from '@/lib/method/types'
import { CREATOR, datasetId, describeEdition, KEYWORDS, LICENCE, TITLE } from './about'
import type { Column, ColumnType, Table } from './table'

/** A written file: its name beside the description, how long it is and its SHA-256. */
export type Measured = { name: string; bytes: number; sha256: string }

const TYPES: Record<ColumnType, string> = {
  text: 'string',
  number: 'number',
  integer: 'integer',
  boolean: 'boolean',
  datetime: 'datetime',
}

/**
 * The descriptor of an edition's CSV files, Data Package 2.0. Paths are relative, so that it holds wherever the files
 * are kept.
 * @see https://datapackage.org/standard/data-package/ , version 2.0
 */
export function dataPackage(edition: Edition, tables: readonly { table: Table; file: Measured }[]): object {
  return {
    $schema: 'https://datapackage.org/profiles/2.0/datapackage.json',
    name: `lampleaf-edition-${edition.number}`,
    id: datasetId(edition.number),
    title: `${TITLE}, edition ${edition.number}`,
    description: describeEdition(edition),
    version: String(edition.number),
    created: edition.publishedAt,
    keywords: KEYWORDS,
    licenses: [{ name: LICENCE.id, path: LICENCE.url, title: LICENCE.title }],
    contributors: [{ title: CREATOR, roles: ['creator', 'publisher'] }],
    resources: tables.map(({ table, file }) => ({
      name: table.name,
      type: 'table',
      path: file.name,
      title: table.title,
      description: table.description,
      format: 'csv',
      mediatype: 'text/csv',
      encoding: 'utf-8',
      bytes: file.bytes,
      hash: `sha256:${file.sha256}`,
      dialect: { delimiter: ',', lineTerminator: '\r\n', quoteChar: '"', doubleQuote: true, header: true },
      schema: {
        fields: table.columns.map(field),
        primaryKey: table.key,
        ...(table.references && {
          foreignKeys: table.references.map(({ columns, table: resource, to }) => ({
            fields: columns,
            reference: { resource, fields: to },
          })),
        }),
        missingValues: [''],
      },
    })),
  }
}

function field({ name, type, unit, meaning, empty, words }: Column): object {
  const wanted = { ...(empty === undefined && { required: true }), ...(words && { enum: words }) }
  return {
    name,
    type: TYPES[type],
    // A property of our own; the standard has none for a unit, and allows others.
    ...(unit && { unit }),
    description: empty ? `${meaning} Empty: ${empty}` : meaning,
    ...(Object.keys(wanted).length > 0 && { constraints: wanted }),
  }
}
