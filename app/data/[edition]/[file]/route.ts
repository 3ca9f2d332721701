import { createHash } from 'node:crypto'
import { answering } from '@/app/api/answering'
import { only } from '@/app/api/methods'
import { storedBytes } from '@/app/api/stored-bytes'
import { CHANGING, FROZEN } from '@/app/api/stored-json'
import { MAX_EDITION } from '@/lib/contract/match-request'
import { problem } from '@/lib/contract/problem'
import { CITATION_FILES, datasetCitations } from '@/lib/dataset/citation-files'
import { CSVW, type DatasetFile, FILE_NAMES } from '@/lib/dataset/files'
import { datasetOf } from '@/lib/server/dataset'
import { editionByNumber } from '@/lib/server/editions'
import { siteUrl } from '@/lib/server/site-url'

export const dynamic = 'force-dynamic'

type Context = { params: Promise<{ edition: string; file: string }> }

/** A file of the data set of a released edition. Its bytes never change, so whoever has them never need ask again. */
export const GET = answering(async (request, { params }: Context) => {
  const { edition: digits, file: name } = await params
  const known = /^[1-9]\d{0,9}$/.test(digits) && Number(digits) <= MAX_EDITION
  // Looked at before anything is read or written for it.
  if (!known || !(FILE_NAMES.includes(name) || Object.hasOwn(CITATION_FILES, name))) return nothing()
  const edition = await editionByNumber(Number(digits))
  if (!edition) return nothing()

  const frozen = FILE_NAMES.includes(name)
  const file = frozen ? (await datasetOf(edition.number))?.files.get(name) : citation(edition, name)
  if (!file) return nothing()
  const entity = { tag: `"${file.sha256}"`, modified: new Date(edition.publishedAt), bytes: file.bytes }
  return storedBytes(request, entity, {
    'content-type': file.type,
    // Names are ours, of letters, digits, dots and hyphens, so they need no quoting of their own (RFC 6266).
    'content-disposition': `attachment; filename="lampleaf-edition-${edition.number}-${name}"`,
    'cache-control': frozen ? FROZEN : CHANGING,
    ...(name.endsWith('.csv') && { link: `<${CSVW}>; rel="describedby"; type="application/csvm+json"` }),
  })
})

function citation(edition: { number: number; publishedAt: string }, name: string): DatasetFile | undefined {
  const found = Object.entries(CITATION_FILES).find(([own]) => own === name)?.[1]
  if (!found) return undefined
  const text = datasetCitations(edition, siteUrl(`/data/${edition.number}`))[found.kind]
  const bytes = new TextEncoder().encode(text)
  return { name, type: found.type, bytes, sha256: createHash('sha256').update(bytes).digest('hex') }
}

const nothing = () => problem(404, 'There is no such file of a released edition')

const { options, refused } = only('GET', 'HEAD')

export { options as OPTIONS, refused as DELETE, refused as PATCH, refused as POST, refused as PUT }
