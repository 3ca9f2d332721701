import type { Metadata } from 'next'
import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { publishedFigures } from '@/lib/findings/published'
import { formatDay } from '@/lib/format/date'
import { latestEdition } from '@/lib/server/editions'
import { DevicesTable } from './devices-table'
import { parseSort, sortRows } from './sort'

export const catalogueMetadata: Metadata = {
  title: 'Devices',
  description:
    'Every electronic-paper reading device on the bench: lightness, whiteness, tint and contrast of its page, each measured and with its doubt.',
  alternates: { canonical: '/devices' },
}

export type CatalogueSearch = Record<string, string | string[] | undefined>

/** The whole catalogue as an address asks for it. */
export async function Catalogue({ search }: { search: CatalogueSearch }) {
  const edition = await latestEdition()
  if (!edition) {
    return (
      <main className="measure py-12">
        <h1>Devices</h1>
        <Notice className="mt-6 max-w-[60ch]">
          No edition has been released yet, so there are no figures to show. <Link href="/method">How we measure</Link>{' '}
          is already there to read.
        </Notice>
      </main>
    )
  }
  const sort = parseSort(search)
  const rows = edition.devices.map((device) => ({ device, figures: publishedFigures(edition, device) }))
  return (
    <main className="measure py-12">
      <h1>Devices</h1>
      <p className="mt-3 max-w-[68ch] text-soft">
        The page of every device in edition {edition.number}, released{' '}
        <time dateTime={edition.publishedAt}>{formatDay(edition.publishedAt)}</time>, in full white with the front light
        off: geometry d/8°, specular included, D65, 10° observer. What a maker does not state is marked so.
      </p>
      <DevicesTable rows={sortRows(rows, sort)} sort={sort} />
      <p className="mt-5 max-w-[68ch] text-small text-soft" id="dagger">
        † The CIE formulas for whiteness and tint are vouched for only for surfaces lighter than any electronic paper.
        We publish them because readers ask, and would not order by them: on grey pages whiteness is mostly blueness.{' '}
        <Link href="/method#q-whiteness">Why</Link>. Differences smaller than the doubts shown are too close to call.
      </p>
    </main>
  )
}
