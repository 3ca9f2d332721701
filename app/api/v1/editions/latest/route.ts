import { latestEdition } from '@/lib/server/editions'
import { answering } from '../../../answering'
import { only } from '../../../methods'
import { CHANGING } from '../../../stored-json'
import { editionAnswer, noneReleased } from '../edition-answer'

export const dynamic = 'force-dynamic'

/** The newest released edition. */
export const GET = answering(async (request) => {
  const edition = await latestEdition()
  return edition ? editionAnswer(request, edition, CHANGING) : noneReleased()
})

const { options, refused } = only('GET', 'HEAD')

export { options as OPTIONS, refused as DELETE, refused as PATCH, refused as POST, refused as PUT }
