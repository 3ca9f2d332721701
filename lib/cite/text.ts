import { formatDay } from '@/lib/format/date'
import { formatList } from '@/lib/format/list'
import type { Work } from './work'

/** A citation as a person writes it: who, year, what, which edition, when released, where. */
export function citationText({ authors, title, edition, publishedOn, url, licence }: Work): string {
  const year = publishedOn.slice(0, 4)
  const rights = licence === undefined ? '' : ` Licence: ${licence}.`
  return `${formatList(authors)} (${year}). ${title}. Edition ${edition}, released ${formatDay(publishedOn)}. ${url}.${rights}`
}
