import 'server-only'
import { config } from './config'

/** The absolute address of a path on this site, for feeds, mails and structured data. */
export function siteUrl(path: string): string {
  return new URL(path, config().baseUrl).href
}
