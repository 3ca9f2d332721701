import Link from 'next/link'
import { catalogueHref } from '@/lib/catalogue/address'
import { type FilterInForce, withoutFilter, withoutFilters } from '@/lib/catalogue/filters'
import type { DeviceList } from '@/lib/catalogue/list'
import type { CatalogueQuery } from '@/lib/catalogue/schema'
import { filterWords } from '@/lib/catalogue/words'
import { formatNumber } from '@/lib/format/number'
import type { Units } from '@/lib/look'

/** How many devices match, and each filter in force with a link that takes it out. */
export function FiltersInForce({
  query,
  filters,
  units,
  list,
  all,
}: {
  query: CatalogueQuery
  filters: readonly FilterInForce[]
  units: Units
  list: DeviceList
  all: number
}) {
  return (
    <div className="mt-6">
      <p role="status" className="font-semibold">
        {countWords(list, all, filters.length > 0)}
      </p>
      {filters.length > 0 && (
        <nav aria-label="Filters in force">
          <ul className="mt-2 flex flex-wrap gap-2">
            {filters.map((filter) => (
              <li key={`${filter.key} ${filter.value}`}>
                <Link
                  href={catalogueHref(withoutFilter(query, filter))}
                  prefetch={false}
                  scroll={false}
                  className="inline-flex min-h-11 items-center gap-2 rounded-card border border-edge bg-sheet px-3 text-small hover:border-shade"
                >
                  <span className="sr-only">Remove: </span>
                  {filterWords(filter, units)}
                  <span aria-hidden="true">×</span>
                </Link>
              </li>
            ))}
            {filters.length > 1 && (
              <li>
                <Link
                  href={catalogueHref(withoutFilters(query))}
                  prefetch={false}
                  scroll={false}
                  className="inline-flex min-h-11 items-center px-1 text-small"
                >
                  Remove all filters
                </Link>
              </li>
            )}
          </ul>
        </nav>
      )}
    </div>
  )
}

function countWords({ known, open }: DeviceList, all: number, filtered: boolean): string {
  if (!filtered) return `${formatNumber(all)} ${all === 1 ? 'device' : 'devices'}`
  const match = `${formatNumber(known.length)} of ${formatNumber(all)} devices ${known.length === 1 ? 'matches' : 'match'}.`
  if (open.length === 0) return match
  return `${match} ${formatNumber(open.length)} more ${open.length === 1 ? 'does' : 'do'} not state what you asked for.`
}
