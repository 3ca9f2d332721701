import { latestEdition } from '@/lib/server/editions'
import { answering } from '../../answering'
import { only } from '../../methods'
import { noneReleased } from '../editions/edition-answer'
import { listAnswer } from './list-answer'

export const dynamic = 'force-dynamic'

/** The devices of the newest edition, filtered, ordered and paged as the catalogue is. */
export const GET = answering(async (request) => {
  const edition = await latestEdition()
  return edition ? listAnswer(request, edition) : noneReleased()
})

const { options, refused } = only('GET', 'HEAD')

export { options as OPTIONS, refused as DELETE, refused as PATCH, refused as POST, refused as PUT }
