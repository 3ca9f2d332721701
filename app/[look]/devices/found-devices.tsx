import { Button } from '@/components/ui/button'
import { Pager } from '@/components/ui/pager'
import { catalogueHref } from '@/lib/catalogue/address'
import { type DeviceList, pageOf } from '@/lib/catalogue/list'
import type { CatalogueQuery } from '@/lib/catalogue/schema'
import { sortFor } from '@/lib/catalogue/sort'
import { formatNumber } from '@/lib/format/number'
import type { Look } from '@/lib/look'
import { COMPARE_FORM, DevicesTable, OrderBy, tableWords } from './devices-table'

/** Devices on one numbered page: few on electronic paper, which turns pages better than it scrolls (house). */
const PER_PAGE = { paper: 8, other: 100 }

/** The devices a list finds, those not ruled out apart, with boxes to choose some for comparing. */
export function FoundDevices({
  list,
  query,
  look,
  filtered,
}: {
  list: DeviceList
  query: CatalogueQuery
  look: Look
  filtered: boolean
}) {
  const sort = sortFor(query)
  const perPage = look.theme === 'paper' ? PER_PAGE.paper : PER_PAGE.other
  const all = [...list.known, ...list.open]
  const { items, page } = pageOf(all, query.page ?? 1, perPage)
  const known = items.filter(({ notStated }) => notStated.length === 0)
  const open = items.filter(({ notStated }) => notStated.length > 0)
  const hrefFor = (wanted: number) => catalogueHref({ ...query, page: wanted })
  return (
    <div className="group/list @container mt-6">
      <OrderBy query={query} sort={sort} />
      {known.length > 0 && (
        <DevicesTable
          caption={tableWords(list.known.length, filtered ? 'match' : 'all', sort)}
          rows={known}
          className="later"
          {...{ query, sort, look }}
        />
      )}
      {open.length > 0 && (
        <section aria-labelledby="open" className="mt-10">
          <h2 id="open" className="text-h3">
            Not stated, so neither ruled in nor out
          </h2>
          <p className="mt-1 max-w-[68ch] text-small text-soft">
            {formatNumber(list.open.length)} {list.open.length === 1 ? 'device fails' : 'devices fail'} none of your
            filters, but what you asked for is not stated of {list.open.length === 1 ? 'it' : 'them'}.
          </p>
          <DevicesTable
            caption={tableWords(list.open.length, 'open', sort)}
            rows={open}
            {...{ query, sort, look }}
            className="mt-4"
          />
        </section>
      )}
      <Pager paging={{ page, perPage, hrefFor }} total={all.length} what="Devices" />
      <form
        id={COMPARE_FORM}
        action="/compare"
        aria-label="Compare"
        className="mt-6 flex flex-wrap items-center gap-x-5 gap-y-2 py-3 group-has-[tbody_:checked]/list:sticky group-has-[tbody_:checked]/list:bottom-0 group-has-[tbody_:checked]/list:z-10 group-has-[tbody_:checked]/list:border-t group-has-[tbody_:checked]/list:border-rule group-has-[tbody_:checked]/list:bg-bench"
      >
        <Button type="submit">Compare</Button>
        <p className="text-small text-soft">Tick two to four devices in the list to see their pages side by side.</p>
      </form>
    </div>
  )
}
