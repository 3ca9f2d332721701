import { createHash } from 'node:crypto'
import { csvText } from './csv'
import { csvwMetadata } from './csvw'
import { dataPackage, type Measured } from './data-package'
import { jsonText } from './json'
import { datasetRows } from './rows'
import type { DatasetSource } from './source'
import type { Table } from './table'
import { TABLES } from './tables'

/** A file of an edition's data set as it is sent. */
export type DatasetFile = {
  name: string
  /** Content-Type. */
  type: string
  bytes: Uint8Array<ArrayBuffer>
  /** SHA-256 of the bytes, hex. */
  sha256: string
}

const CSV = 'text/csv; charset=utf-8; header=present'
const JSON_TYPE = 'application/json; charset=utf-8'

export const CHECKSUMS = 'SHA256SUMS.txt'
export const DATA_PACKAGE = 'datapackage.json'
export const CSVW = 'csv-metadata.json'

/** The files of a table. */
export const csvName = ({ name }: Pick<Table, 'name'>) => `${name}.csv`
export const jsonName = ({ name }: Pick<Table, 'name'>) => `${name}.json`

/** An edition's data set: its files by name, and what a page says of it. */
export type Dataset = {
  files: Map<string, DatasetFile>
  /** First and last day of the sessions it rests on, ISO 8601. */
  measuredFrom: string
  measuredTo: string
  /** How many rows each table has. */
  rows: Record<string, number>
}

/** Every name an edition's data set has, known without making one. */
export const FILE_NAMES: readonly string[] = [
  ...TABLES.flatMap((table) => [csvName(table), jsonName(table)]),
  DATA_PACKAGE,
  CSVW,
  CHECKSUMS,
]

/**
 * Writes every file of an edition's data set. The same edition gives the same bytes: no clock, no address of the site,
 * no order left to chance. UTF-8 without a byte order mark.
 */
export function writeDataset(source: DatasetSource): Dataset {
  const { edition } = source
  const rows = datasetRows(source)
  const tables = TABLES.map((table: Table) => ({
    table,
    csv: written(csvName(table), CSV, csvText(table, rows[table.name]!)),
    json: written(jsonName(table), JSON_TYPE, jsonText(table, edition.number, rows[table.name]!)),
  }))
  const described = tables.map(({ table, csv }) => ({ table, file: measured(csv) }))
  const files = [
    ...tables.flatMap(({ csv, json }) => [csv, json]),
    written(DATA_PACKAGE, JSON_TYPE, pretty(dataPackage(edition, described))),
    written(CSVW, 'application/csvm+json; charset=utf-8', pretty(csvwMetadata(edition, described))),
  ]
  const sums = written(CHECKSUMS, 'text/plain; charset=utf-8', checksums(files))
  const days = source.sessions.map(({ startedAt }) => startedAt.toISOString().slice(0, 10))
  return {
    files: new Map([...files, sums].map((file) => [file.name, file])),
    // Sessions come in the order they began.
    measuredFrom: days[0] ?? edition.publishedAt.slice(0, 10),
    measuredTo: days.at(-1) ?? edition.publishedAt.slice(0, 10),
    rows: Object.fromEntries(TABLES.map(({ name }) => [name, rows[name]!.length])),
  }
}

/** One line a file, as `sha256sum --check` reads it. */
function checksums(files: readonly DatasetFile[]): string {
  return files.map(({ sha256, name }) => `${sha256}  ${name}\n`).join('')
}

function written(name: string, type: string, text: string): DatasetFile {
  const bytes = new TextEncoder().encode(text)
  return { name, type, bytes, sha256: createHash('sha256').update(bytes).digest('hex') }
}

function measured({ name, bytes, sha256 }: DatasetFile): Measured {
  return { name, bytes: bytes.length, sha256 }
}

const pretty = (value: object) => `${JSON.stringify(value, null, 2)}\n`
