import { completeRequest } from '@/lib/contract/complete-request'
import { matchRequestSchema } from '@/lib/contract/match-request'
import { fieldErrors, problem } from '@/lib/contract/problem'
import type { MatchAnswer } from '@/lib/method/types'
import { editionByNumber, latestEdition } from '@/lib/server/editions'
import { matchOnServer } from '@/lib/server/match'
import { answering } from '../../answering'
import { only } from '../../methods'
import { readJson } from '../../read-json'
import { noneReleased } from '../editions/edition-answer'

export const dynamic = 'force-dynamic'

/** Ranks the devices of an edition for one reader's answers. Nothing of the question is kept. */
export const POST = answering(async (request) => {
  const body = await readJson(request)
  if ('refusal' in body) return body.refusal
  const parsed = matchRequestSchema.safeParse(body.value)
  if (!parsed.success) return problem(400, 'The question is not understood', fieldErrors(parsed.error))

  const { edition: wanted } = parsed.data
  const edition = await (typeof wanted === 'number' ? editionByNumber(wanted) : latestEdition())
  if (!edition) return typeof wanted === 'number' ? noSuchEdition(wanted) : noneReleased()

  const { answers, assumed } = completeRequest(parsed.data)
  const answer: MatchAnswer = { ...(await matchOnServer(edition, answers)), assumed }
  return Response.json(answer, { headers: { 'cache-control': 'no-store' } })
})

const noSuchEdition = (number: number) =>
  problem(404, 'There is no such edition', [
    {
      field: 'edition',
      message: `edition is ${number}, which has not been released; give "latest" or a released number.`,
    },
  ])

const { options, refused } = only('POST')

export { options as OPTIONS, refused as DELETE, refused as GET, refused as PATCH, refused as PUT }
