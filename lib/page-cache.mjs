import FileSystemCache from 'next/dist/server/lib/incremental-cache/file-system-cache.js'
import { contentSecurityPolicy, inlineScriptHashes } from './page-policy.mjs'

const Base = FileSystemCache.default ?? FileSystemCache

/** The one address every page that is not there is answered from. */
const NOT_HERE = /\/not-here$/

/**
 * Next's own cache of finished pages, in memory, with the policy of each page beside it: the hashes of its inline
 * scripts are worked out once, when the page is made, and sent with every answer from the cache.
 */
export default class PageCache extends Base {
  async set(key, value, context) {
    if (value?.kind !== 'APP_PAGE') return super.set(key, value, context)
    const html = typeof value.html === 'string' ? value.html : value.html?.toString('utf8')
    if (html) {
      const policy = contentSecurityPolicy(inlineScriptHashes(html))
      value.headers = { ...value.headers, 'content-security-policy': policy }
    }
    // Anybody can ask for addresses without end; what is not there must not crowd out what is.
    if (value.status === 404 && !NOT_HERE.test(key)) return
    return super.set(key, value, context)
  }
}
