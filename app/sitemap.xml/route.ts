import { findPageChanges } from '@/db/queries/page-changes'
import { lastChanged } from '@/lib/feeds/last-changed'
import { publicPages } from '@/lib/public-pages'
import { read } from '@/lib/server/db'
import { latestEdition } from '@/lib/server/editions'
import { siteUrl } from '@/lib/server/site-url'
import { siteMap } from '@/lib/site-map'
import { answering } from '../api/answering'
import { NOW_AND_THEN, storedDocument } from '../stored-document'

export const dynamic = 'force-dynamic'

/** Every public page with the date it last changed. */
export const GET = answering(async (request) => {
  const pages = publicPages(await latestEdition(), await read(findPageChanges))
  const moments = pages.flatMap(({ changed }) => (changed ? [new Date(changed)] : []))
  return storedDocument(request, {
    body: siteMap(pages, siteUrl('/')),
    type: 'application/xml; charset=utf-8',
    changed: lastChanged(moments, new Date()),
    cacheControl: NOW_AND_THEN,
  })
})
