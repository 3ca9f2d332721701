import type { Metadata } from 'next'
import Link from 'next/link'
import { JsonLd } from '@/components/json-ld'
import { Notice } from '@/components/ui/notice'
import { type Pair, readCatalogue } from '@/lib/catalogue/address'
import { filtersIn } from '@/lib/catalogue/filters'
import { listDevices } from '@/lib/catalogue/list'
import { formatDay } from '@/lib/format/date'
import type { Look } from '@/lib/look'
import { latestEdition } from '@/lib/server/editions'
import { siteUrl } from '@/lib/server/site-url'
import { catalogueStructuredData } from '@/lib/structured/catalogue'
import { FilterForm } from './filter-form'
import { FiltersInForce } from './filters-in-force'
import { FoundDevices } from './found-devices'
import { NoneFound } from './none-found'
import './catalogue.css'

export const catalogueMetadata: Metadata = {
  title: 'Devices',
  description:
    'Every electronic-paper reading device on the bench: lightness, whiteness, tint and contrast of its page, each measured and with its doubt.',
  alternates: { canonical: '/devices' },
}

/** The catalogue as an address asks for it: all of it, or what its filters leave. */
export async function Catalogue({ look, pairs }: { look: Look; pairs: readonly Pair[] }) {
  const edition = await latestEdition()
  if (!edition) return <NothingYet />
  const address = readCatalogue(pairs)
  const { query, problems } = address
  const makers = [...new Set(edition.devices.map(({ maker }) => maker))].sort((a, b) => a.localeCompare(b, 'en-GB'))
  const filters = filtersIn(query, makers)
  const list = listDevices(edition, query)
  return (
    <main className="measure py-12">
      {pairs.length === 0 && (
        <JsonLd
          data={catalogueStructuredData(
            list.known.map(({ device }) => device),
            { edition: edition.number, total: edition.devices.length },
            siteUrl,
          )}
        />
      )}
      <h1>Devices</h1>
      <p className="mt-3 max-w-[68ch] text-soft">
        The page of every device in edition {edition.number}, released{' '}
        <time dateTime={edition.publishedAt}>{formatDay(edition.publishedAt)}</time>, in full white with the front light
        off: geometry d/8°, specular included, D65, 10° observer. What a maker does not state is marked so.
      </p>
      {problems.length > 0 && (
        <Notice look="warning" role="status" className="mt-6 max-w-[68ch]">
          <p>Part of this address was not understood and is left out:</p>
          <ul className="list-disc pl-5">
            {problems.map(({ message }) => (
              <li key={message}>{message}</li>
            ))}
          </ul>
        </Notice>
      )}
      <FilterForm query={query} makers={makers} units={look.units} filters={filters.length} />
      <FiltersInForce query={query} filters={filters} units={look.units} list={list} all={edition.devices.length} />
      {list.known.length + list.open.length > 0 ? (
        <FoundDevices list={list} query={query} look={look} filtered={filters.length > 0} />
      ) : (
        <NoneFound query={query} devices={edition.devices} units={look.units} makers={makers} />
      )}
      <p className="mt-5 max-w-[68ch] text-small text-soft" id="dagger">
        † The CIE formulas for whiteness and tint are vouched for only for surfaces lighter than any electronic paper.
        We publish them because readers ask, and would not order by them: on grey pages whiteness is mostly blueness.{' '}
        <Link href="/method#q-whiteness" prefetch={false}>
          Why
        </Link>
        . Differences smaller than the doubts shown are too close to call.
      </p>
    </main>
  )
}

function NothingYet() {
  return (
    <main className="measure py-12">
      <h1>Devices</h1>
      <Notice className="mt-6 max-w-[60ch]">
        No edition has been released yet, so there are no figures to show.{' '}
        <Link href="/method" prefetch={false}>
          How we measure
        </Link>{' '}
        is already there to read.
      </Notice>
    </main>
  )
}
