import { JSON_FEED_TYPE, jsonFeed } from '@/lib/feeds/json-feed'
import { lastChanged } from '@/lib/feeds/last-changed'
import { latestNews } from '@/lib/server/news'
import { siteUrl } from '@/lib/server/site-url'
import { answering } from '../api/answering'
import { NOW_AND_THEN, storedDocument } from '../stored-document'

export const dynamic = 'force-dynamic'

/** The same news as JSON Feed 1.1. */
export const GET = answering(async (request) => {
  const items = await latestNews()
  return storedDocument(request, {
    body: jsonFeed(items, siteUrl('/')),
    type: JSON_FEED_TYPE,
    changed: lastChanged(
      items.map((item) => item.updated),
      new Date(),
    ),
    cacheControl: NOW_AND_THEN,
  })
})
