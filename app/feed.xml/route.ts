import { ATOM_TYPE, atomFeed } from '@/lib/feeds/atom'
import { lastChanged } from '@/lib/feeds/last-changed'
import { latestNews } from '@/lib/server/news'
import { siteUrl } from '@/lib/server/site-url'
import { answering } from '../api/answering'
import { NOW_AND_THEN, storedDocument } from '../stored-document'

export const dynamic = 'force-dynamic'

/** Editions, corrections and new devices as Atom 1.0. */
export const GET = answering(async (request) => {
  const items = await latestNews()
  return storedDocument(request, {
    body: atomFeed(items, siteUrl('/')),
    type: ATOM_TYPE,
    changed: lastChanged(
      items.map((item) => item.updated),
      new Date(),
    ),
    cacheControl: NOW_AND_THEN,
  })
})
