import { problem } from '@/lib/contract/problem'
import { readAddress } from '@/lib/og/address'
import { editionByNumber } from '@/lib/server/editions'
import { pictureOf } from '@/lib/server/pictures'
import { answering } from '../../api/answering'
import { FROZEN } from '../../api/stored-json'

export const dynamic = 'force-dynamic'

type Context = { params: Promise<{ what: string[] }> }

/** The picture others show beside a link to a page. An edition never changes, so neither does a picture of it. */
export const GET = answering(async (_request, { params }: Context) => {
  const address = readAddress((await params).what)
  const edition = address && (await editionByNumber(address.edition))
  const png = address && edition && (await pictureOf(edition, address.subject))
  if (!png) return problem(404, 'There is no picture at this address')
  return new Response(png, { headers: { 'content-type': 'image/png', 'cache-control': FROZEN } })
})
