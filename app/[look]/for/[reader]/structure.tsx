import { JsonLd } from '@/components/json-ld'
import { deviceOf, type Result } from '@/lib/quiz/result'
import type { Picks } from '@/lib/readers/picks'
import type { Reader } from '@/lib/readers/reader'
import { siteUrl } from '@/lib/server/site-url'
import { picksList } from '@/lib/structured/picks'

/** The picks as structured data. */
export function ReaderStructure({ reader, result, picks }: { reader: Reader; result: Result; picks: Picks }) {
  return (
    <JsonLd
      data={picksList({
        name: `Picks for readers: ${reader.name}`,
        description: `${reader.line} By Method ${result.match.method} on edition ${result.edition.number}.`,
        url: siteUrl(`/for/${reader.slug}`),
        groups: picks.shown,
        nameOf: (slug) => deviceOf(result, slug).name,
        urlOf: (slug) => siteUrl(`/devices/${slug}`),
      })}
    />
  )
}
