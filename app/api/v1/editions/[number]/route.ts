import { MAX_EDITION } from '@/lib/contract/match-request'
import { problem } from '@/lib/contract/problem'
import { editionByNumber } from '@/lib/server/editions'
import { answering } from '../../../answering'
import { only } from '../../../methods'
import { FROZEN } from '../../../stored-json'
import { editionAnswer } from '../edition-answer'

export const dynamic = 'force-dynamic'

type Context = { params: Promise<{ number: string }> }

/** The released edition of this number. One address for each: no leading zeros, no signs. */
export const GET = answering(async (request, { params }: Context) => {
  const { number } = await params
  const known = /^[1-9]\d{0,9}$/.test(number) && Number(number) <= MAX_EDITION
  const edition = known ? await editionByNumber(Number(number)) : null
  return edition
    ? editionAnswer(request, edition, FROZEN)
    : problem(404, 'There is no released edition at this address')
})

const { options, refused } = only('GET', 'HEAD')

export { options as OPTIONS, refused as DELETE, refused as PATCH, refused as POST, refused as PUT }
