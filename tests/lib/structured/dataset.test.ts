import { expect, test } from 'vitest'
import { writeDataset } from '@/lib/dataset/files'
import { datasetJsonLd } from '@/lib/structured/dataset'
import { makeDatasetSource } from '@/tests/fixtures/dataset'
import { schemaOrgErrors } from '@/tests/fixtures/schema-org'

const source = makeDatasetSource()
const dataset = writeDataset(source)
const files = [...dataset.files.values()].map(({ bytes, ...file }) => ({ ...file, bytes: bytes.length }))
const url = 'https://guide.example/data/4'
const data = datasetJsonLd({ ...dataset, edition: source.edition, folder: `${url}/`, url, files }) as Record<
  string,
  unknown
>

// The vocabulary schema.org publishes (tests/schemas/schema-org.ttl): types, domains and ranges.
test('a data set is rightly described by the published vocabulary of schema.org', () => {
  expect(schemaOrgErrors([data])).toEqual([])
})

test('its description names every file with its address, kind and checksum', () => {
  const downloads = data.distribution as Record<string, string>[]
  expect(downloads.map(({ contentUrl }) => contentUrl)).toEqual(
    files.map(({ name }) => `https://guide.example/data/4/${name}`),
  )
  for (const { name, encodingFormat, sha256 } of downloads) {
    expect(encodingFormat).toMatch(/^[a-z]+\/[a-z+]+$/)
    expect(sha256).toBe(dataset.files.get(name!)!.sha256)
  }
})

test('its description says when it was measured, under which licence, and each quantity with its unit', () => {
  expect(data).toMatchObject({
    temporalCoverage: '2026-01-14/2026-01-15',
    license: 'https://creativecommons.org/licenses/by/4.0/',
    isAccessibleForFree: true,
    version: '4',
  })
  const variables = data.variableMeasured as Record<string, string>[]
  expect(variables).toContainEqual(expect.objectContaining({ name: 'figures.page_l', unitText: 'L*' }))
  for (const { unitText } of variables) expect(unitText).toBeTruthy()
})
