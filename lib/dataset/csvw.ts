import type { Edition } from '@/lib/method/types'
import { CREATOR, datasetId, describeEdition, LICENCE, TITLE } from './about'
import type { Column, ColumnType, Table } from './table'

const TYPES: Record<ColumnType, string> = {
  text: 'string',
  number: 'double',
  integer: 'integer',
  boolean: 'boolean',
  datetime: 'dateTime',
}

/**
 * The same description as a CSVW table group. Addresses are relative to the file itself, `csv-metadata.json`, which is
 * where a reader of one CSV file looks for it.
 * @see W3C, Metadata Vocabulary for Tabular Data, 17 December 2015
 */
export function csvwMetadata(edition: Edition, tables: readonly { table: Table; file: { name: string } }[]): object {
  return {
    '@context': ['http://www.w3.org/ns/csvw', { '@language': 'en' }],
    '@type': 'TableGroup',
    'dc:title': `${TITLE}, edition ${edition.number}`,
    'dc:description': describeEdition(edition),
    'dc:identifier': datasetId(edition.number),
    'dc:creator': CREATOR,
    'dc:issued': { '@value': edition.publishedAt.slice(0, 10), '@type': 'xsd:date' },
    'dc:license': { '@id': LICENCE.url },
    dialect: { header: true, encoding: 'utf-8', lineTerminators: ['\r\n'] },
    tables: tables.map(({ table, file }) => ({
      '@type': 'Table',
      url: file.name,
      'dc:title': table.title,
      'dc:description': table.description,
      tableSchema: {
        '@type': 'Schema',
        columns: table.columns.map(column),
        primaryKey: table.key,
        ...(table.references && {
          foreignKeys: table.references.map(({ columns, table: resource, to }) => ({
            columnReference: columns,
            reference: { resource: `${resource}.csv`, columnReference: to },
          })),
        }),
      },
    })),
  }
}

function column({ name, type, unit, meaning, empty, words }: Column): object {
  return {
    '@type': 'Column',
    name,
    titles: name,
    'dc:description': empty ? `${meaning} Empty: ${empty}` : meaning,
    ...(unit && { 'schema:unitText': unit }),
    datatype: words ? { base: TYPES[type], format: words.join('|') } : TYPES[type],
    required: empty === undefined,
  }
}
