import { readFileSync } from 'node:fs'
import Ajv from 'ajv'
import addFormats from 'ajv-formats'
import { describe, expect, test } from 'vitest'
import { CHECKSUMS, CSVW, DATA_PACKAGE, FILE_NAMES, writeDataset } from '@/lib/dataset/files'
import { TABLES } from '@/lib/dataset/tables'
import { readCsv } from '@/tests/dataset/read-csv'
import { csvwCellErrors, csvwErrors } from '@/tests/fixtures/csvw'
import { makeDatasetSource } from '@/tests/fixtures/dataset'

const dataset = writeDataset(makeDatasetSource())
const text = (name: string) =>
  new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(dataset.files.get(name)!.bytes)
const json = (name: string) => JSON.parse(text(name))

test('a data set has the files it says it has, and their names need no quoting', () => {
  expect([...dataset.files.keys()].sort()).toEqual([...FILE_NAMES].sort())
  for (const name of FILE_NAMES) expect(name).toMatch(/^[A-Za-z0-9-]+\.[a-z]+$/)
})

test('every file is UTF-8 without a byte order mark, and known by its type', () => {
  for (const { name, type } of dataset.files.values()) {
    expect(text(name).charCodeAt(0), name).not.toBe(0xfeff)
    expect(type, name).toMatch(/^(text\/(csv|plain)|application\/(json|csvm\+json)); charset=utf-8/)
  }
})

test('days measured and rows counted are those of the sources', () => {
  expect([dataset.measuredFrom, dataset.measuredTo]).toEqual(['2026-01-14', '2026-01-15'])
  expect(dataset.rows).toMatchObject({
    devices: 2,
    figures: 2,
    sets: 6,
    readings: 36,
    spectra: 12,
    controls: 4,
    sessions: 2,
  })
})

test('what would be a formula is defended in the CSV and stands as it is in the JSON', () => {
  const [, csv] = readCsv(text('devices.csv'))
  expect([csv!.name, csv!.maker, csv!.revision]).toEqual(["'=cmd", "'+Maker, the 'second'", "''-1"])
  const [, row] = json('devices.json').rows
  expect([row.name, row.maker, row.revision]).toEqual(['=cmd', "+Maker, the 'second'", "'-1"])
})

test('what is not stated is said to be so, and never a no', () => {
  const rows = readCsv(text('specs.csv')).filter(({ device }) => device === 'other-10')
  expect(new Set(rows.map(({ stated }) => stated))).toEqual(new Set(['not-stated']))
})

test('the bytes are those first written: another way of writing would change released editions', () => {
  expect(dataset.files.get(CHECKSUMS)!.sha256).toBe('c90c847640e04bd6e8b970a4402638a0b99385a896a1300b04f122806b91eff1')
})

describe('the Data Package', () => {
  // Data Package 2.0: its published profile, tests/schemas/data-package-2.0.json.
  const ajv = new Ajv({ strict: false, allErrors: true })
  addFormats(ajv)
  const validate = ajv.compile(JSON.parse(readFileSync('tests/schemas/data-package-2.0.json', 'utf8')))

  test('holds to the published profile', () => {
    validate(json(DATA_PACKAGE))
    expect(validate.errors).toBeNull()
  })

  test('would be refused with a kind of field, a path or a hash the profile does not know', () => {
    const broken = (change: (descriptor: ReturnType<typeof json>) => void) => {
      const descriptor = json(DATA_PACKAGE)
      change(descriptor)
      return validate(descriptor)
    }
    expect(
      broken((one) => {
        one.resources[0].schema.fields[0].type = 'words'
      }),
    ).toBe(false)
    expect(
      broken((one) => {
        one.resources[0].path = '../devices.csv'
      }),
    ).toBe(false)
    expect(
      broken((one) => {
        one.resources[0].hash = 'sha256'
      }),
    ).toBe(false)
    expect(
      broken((one) => {
        delete one.resources
      }),
    ).toBe(false)
  })

  test('describes each CSV file as it is: length, hash, columns in their order', () => {
    for (const resource of json(DATA_PACKAGE).resources) {
      const { bytes, sha256 } = dataset.files.get(resource.path)!
      expect([resource.bytes, resource.hash]).toEqual([bytes.length, `sha256:${sha256}`])
      const [header] = text(resource.path).split('\r\n')
      expect(resource.schema.fields.map(({ name }: { name: string }) => name).join()).toBe(header)
    }
  })
})

describe('the CSVW metadata', () => {
  // W3C, Metadata Vocabulary for Tabular Data: the published vocabulary, tests/schemas/csvw.nq.
  test('uses the terms of the published vocabulary where they belong', () => {
    expect(csvwErrors(json(CSVW))).toEqual([])
  })

  test('would be found out with a term that is not there or not its own, or a key that leads nowhere', () => {
    const broken = (change: (metadata: ReturnType<typeof json>) => void) => {
      const metadata = json(CSVW)
      change(metadata)
      return csvwErrors(metadata)
    }
    expect(
      broken((one) => {
        one.tables[0].unit = 'mm'
      }),
    ).toEqual(['/tables/unit is no term'])
    expect(
      broken((one) => {
        one.tables[0].quoteChar = '"'
      })[0],
    ).toMatch(/Table has no such property/)
    expect(
      broken((one) => {
        one.tables[1].tableSchema.primaryKey = ['nobody']
      }),
    ).toEqual(['figures.csv: primaryKey names nobody'])
    expect(
      broken((one) => {
        one.tables[1].tableSchema.foreignKeys[0].reference.resource = 'gone.csv'
      })[0],
    ).toMatch(/gone\.csv/)
  })

  test('describes every cell of every file rightly', () => {
    for (const { name } of TABLES) {
      const file = text(`${name}.csv`)
      expect(csvwCellErrors(json(CSVW), `${name}.csv`, file.split('\r\n')[0]!.split(','), readCsv(file))).toEqual([])
    }
  })

  test('and the Data Package say of each column what the dictionary says', () => {
    const resources = json(DATA_PACKAGE).resources
    const tables = json(CSVW).tables
    TABLES.forEach(({ columns }, t) => {
      columns.forEach(({ meaning, unit, empty }, c) => {
        const field = resources[t].schema.fields[c]
        const column = tables[t].tableSchema.columns[c]
        expect(field.description.startsWith(meaning)).toBe(true)
        expect(column['dc:description']).toBe(field.description)
        expect([field.unit, column['schema:unitText']]).toEqual([unit, unit])
        expect([field.constraints?.required ?? false, column.required]).toEqual([
          empty === undefined,
          empty === undefined,
        ])
      })
    })
  })
})

test('every column says what it means, and one that is a quantity in which unit', () => {
  for (const { name: table, columns } of TABLES) {
    for (const { name, type, meaning, unit, empty } of columns) {
      expect(meaning, `${table}.${name}`).toMatch(/\.$/)
      if (type === 'number') expect(unit, `${table}.${name}`).toBeTruthy()
      if (empty !== undefined) expect(empty, `${table}.${name}`).toMatch(/\.$/)
    }
  }
})
