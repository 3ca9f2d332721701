import { createHash } from 'node:crypto'
import { listEditions } from '@/db/queries/editions'
import type { EditionList } from '@/lib/contract/edition'
import { read } from '@/lib/server/db'
import { answering } from '../../answering'
import { only } from '../../methods'
import { CHANGING, storedJson } from '../../stored-json'

export const dynamic = 'force-dynamic'

/** Every released edition, newest first, with the address of its document. */
export const GET = answering(async (request) => {
  const rows = await read(listEditions)
  const list: EditionList = {
    editions: rows.map(({ number, publishedAt, sha256, title, note }) => ({
      number,
      publishedAt: publishedAt.toISOString(),
      sha256,
      title,
      note,
      href: `/api/v1/editions/${number}`,
    })),
  }
  const body = JSON.stringify(list)
  return storedJson(request, body, createHash('sha256').update(body).digest('hex'), CHANGING)
})

const { options, refused } = only('GET', 'HEAD')

export { options as OPTIONS, refused as DELETE, refused as PATCH, refused as POST, refused as PUT }
