import { CREATOR, datasetId, describeEdition, KEYWORDS, LICENCE, TECHNIQUE, TITLE } from '@/lib/dataset/about'
import type { Table } from '@/lib/dataset/table'
import { TABLES } from '@/lib/dataset/tables'
import type { Edition } from '@/lib/method/types'

/** A file one may load: its name beside the others, its media type, how long it is and its SHA-256. */
export type DataFile = { name: string; type: string; bytes: number; sha256: string }

type Described = {
  edition: Pick<Edition, 'number' | 'publishedAt' | 'devices'>
  /** Of the files given here, absolute: `…/data/3/`. */
  folder: string
  /** The page of the data set, absolute. */
  url: string
  files: readonly DataFile[]
  /** First and last day of measuring, ISO 8601. */
  measuredFrom: string
  measuredTo: string
}

const MEASURED = ['figures', 'readings', 'controls']

/**
 * The data set of an edition as schema.org knows one, with a download a file. Every variable comes from the description
 * the dictionary is made of.
 * @see https://schema.org/Dataset
 */
export function datasetJsonLd({ edition, folder, url, files, measuredFrom, measuredTo }: Described): object {
  return {
    '@context': 'https://schema.org',
    '@type': 'Dataset',
    '@id': datasetId(edition.number),
    name: `${TITLE}, edition ${edition.number}`,
    description: describeEdition(edition),
    url,
    identifier: datasetId(edition.number),
    version: String(edition.number),
    datePublished: edition.publishedAt.slice(0, 10),
    temporalCoverage: `${measuredFrom}/${measuredTo}`,
    inLanguage: 'en-GB',
    keywords: KEYWORDS,
    license: LICENCE.url,
    isAccessibleForFree: true,
    creator: { '@type': 'Organization', name: CREATOR, url: new URL('/', url).href },
    measurementTechnique: TECHNIQUE,
    variableMeasured: TABLES.filter(({ name }) => MEASURED.includes(name)).flatMap(variables),
    distribution: files.map(({ name, type, bytes, sha256 }) => ({
      '@type': 'DataDownload',
      name,
      contentUrl: new URL(name, folder).href,
      encodingFormat: type.split(';')[0],
      contentSize: `${bytes} B`,
      sha256,
    })),
  }
}

/** The columns of a table that are quantities. */
function variables({ name: table, columns }: Table): object[] {
  return columns
    .filter(({ unit }) => unit !== undefined)
    .map(({ name, unit, meaning }) => ({
      '@type': 'PropertyValue',
      name: `${table}.${name}`,
      description: meaning,
      unitText: unit,
    }))
}
