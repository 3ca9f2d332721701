import Link from 'next/link'
import { ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { catalogueHref } from '@/lib/catalogue/address'
import { filtersIn, type Toll, tolls, withoutFilters } from '@/lib/catalogue/filters'
import type { CatalogueQuery } from '@/lib/catalogue/schema'
import { filterWords } from '@/lib/catalogue/words'
import { formatList } from '@/lib/format/list'
import { formatNumber } from '@/lib/format/number'
import type { Units } from '@/lib/look'
import type { EditionDevice } from '@/lib/method/types'

/** No device is left: says which filter rules most out, and leads to the list without it. */
export function NoneFound({
  query,
  devices,
  units,
  makers,
}: {
  query: CatalogueQuery
  devices: readonly EditionDevice[]
  units: Units
  makers: readonly string[]
}) {
  const [dearest, ...others] = tolls(devices, query)
  const words = ({ key }: Toll) =>
    formatList(
      filtersIn(query, makers)
        .filter((filter) => filter.key === key)
        .map((filter) => filterWords(filter, units)),
    )
  const without = ({ key }: Toll) => {
    const { [key]: _, page: __, ...rest } = query
    return catalogueHref(rest)
  }
  return (
    <Notice className="mt-6 grid max-w-[68ch] gap-3">
      <h2 className="text-h3">No device in this edition is left</h2>
      {dearest && (
        <p>
          The filter that rules out most is <strong>{words(dearest)}</strong>: {formatNumber(dearest.ruledOut)} of{' '}
          {formatNumber(devices.length)} devices.{' '}
          {dearest.leftWithout > 0
            ? `Without it ${formatNumber(dearest.leftWithout)} would be left.`
            : others.length > 0 && 'Even without it none would be left.'}
        </p>
      )}
      <p className="flex flex-wrap items-center gap-x-6 gap-y-2">
        {dearest && others.length > 0 && (
          <ButtonLink href={without(dearest)} prefetch={false} look="quiet">
            Leave that filter out
          </ButtonLink>
        )}
        <Link
          href={catalogueHref(withoutFilters(query))}
          prefetch={false}
          className="inline-flex min-h-11 items-center"
        >
          Show all devices
        </Link>
      </p>
    </Notice>
  )
}
