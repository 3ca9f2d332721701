import 'server-only'
import { listNews } from '@/db/queries/news'
import { NEWS_LIMIT, type NewsItem, newsItems } from '@/lib/feeds/news'
import { read } from './db'

/** The news both feeds tell, newest first. */
export async function latestNews(): Promise<NewsItem[]> {
  return newsItems(await read((db) => listNews(db, NEWS_LIMIT)))
}
