import Link from 'next/link'
import { Sheet } from '@/components/sheet'
import { formatList } from '@/lib/format/list'
import { deviceOf } from '@/lib/quiz/result'
import { picksOf } from '@/lib/readers/picks'
import type { Reader } from '@/lib/readers/reader'
import { answeredFor } from './answered'

const MOST_NAMED = 3

/** One reader in the list: who it is, and the pick or the tie the method finds. */
export async function ReaderRow({ reader }: { reader: Reader }) {
  const result = await answeredFor(reader)
  const [group = []] = result ? picksOf(result.match.ranked).groups : []
  const devices = result ? group.map(({ slug }) => deviceOf(result, slug)) : []
  const shown = devices.slice(0, MOST_NAMED)
  const names = shown.map(({ name }) => name)
  const more = devices.length - shown.length
  const named = formatList(more > 0 ? [...names, `${more} more`] : names)
  return (
    <li className="grid gap-x-10 gap-y-1 border-b border-rule py-5 md:grid-cols-[minmax(0,1.1fr)_minmax(0,1fr)]">
      <div>
        <h2 className="text-h3">
          <Link href={`/for/${reader.slug}`} prefetch={false} className="inline-flex min-h-11 items-center sm:min-h-8">
            {reader.name}
          </Link>
        </h2>
        <p className="text-soft">{reader.line}</p>
      </div>
      {result && (
        <div className="flex items-center gap-4">
          {shown.map(({ slug, page, ink }) => (
            <Sheet key={slug} page={page} ink={ink} size="thumb" />
          ))}
          <p>
            {devices.length === 0 && <span className="text-soft">No device of this edition meets these answers.</span>}
            {devices.length > 1 && <span className="block text-small text-soft">Too close to call</span>}
            <strong>{named}</strong>
          </p>
        </div>
      )}
    </li>
  )
}
