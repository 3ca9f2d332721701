import { JsonLd } from '@/components/json-ld'
import { type Citations, datasetCitations } from '@/lib/dataset/citation-files'
import type { Dataset } from '@/lib/dataset/files'
import type { Edition } from '@/lib/method/types'
import { siteUrl } from '@/lib/server/site-url'
import { datasetJsonLd } from '@/lib/structured/dataset'
import { Cite } from './cite'
import { Descriptions, FilesTable } from './files-table'

/** The data set of one edition: its files, what describes them, how to cite it. */
export function EditionData({ edition, dataset }: { edition: Edition; dataset: Dataset }) {
  const url = siteUrl(`/data/${edition.number}`)
  const citations: Citations = datasetCitations(edition, url)
  const files = [...dataset.files.values()].map(({ bytes, ...file }) => ({ ...file, bytes: bytes.length }))
  return (
    <>
      <JsonLd data={datasetJsonLd({ ...dataset, edition, folder: `${url}/`, url, files })} />
      <section id="files" aria-labelledby="files-title" className="mt-10 scroll-mt-4">
        <h2 id="files-title">Files of edition {edition.number}</h2>
        <FilesTable edition={edition.number} dataset={dataset} />
        <Descriptions edition={edition.number} dataset={dataset} />
      </section>
      <section id="cite" aria-labelledby="cite-title" className="mt-12 scroll-mt-4">
        <h2 id="cite-title">Licence and citation</h2>
        <Cite edition={edition.number} citations={citations} />
      </section>
    </>
  )
}
