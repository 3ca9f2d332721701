import { applyLimits } from '@/lib/method/limits'
import type { EditionDevice, Limits } from '@/lib/method/types'
import { CURRENCY } from './currency'
import { FILTER_KEYS, type FilterKey } from './keys'
import { makerKey } from './maker'
import type { CatalogueQuery } from './schema'
import type { Side } from './words'

/** One filter as it stands; of several makers each is one, for each can be taken out. */
export type FilterInForce =
  | { key: 'q'; value: string }
  | { key: 'maker'; value: string; name: string }
  | { key: 'min-size' | 'max-size' | 'max-price' | 'max-weight' | 'water'; value: number }
  | { key: Side; value: boolean }

/** Devices that meet every filter, and those known to fail none but silent on something asked for. */
export type Found<Device> = { known: Device[]; open: { device: Device; notStated: string[] }[] }

/**
 * Narrows a list. A filter takes out only devices known to fail it: what is not stated, a price in another currency
 * too, leaves a device apart with the fields it is silent on, neither ruled in nor out. Method 1, section 7.
 */
export function filterDevices(devices: readonly EditionDevice[], query: CatalogueQuery): Found<EditionDevice> {
  const words = wordsIn(query.q ?? '')
  const makers = query.maker ?? []
  const named = devices.filter(({ name, maker }) => {
    const text = plain(`${name} ${maker}`)
    return words.every((word) => text.includes(word)) && (makers.length === 0 || makers.includes(makerKey(maker)))
  })
  const { left } = applyLimits(named, limitsOf(query))
  return {
    known: left.filter(({ notStated }) => notStated.length === 0).map(({ device }) => device),
    open: left.filter(({ notStated }) => notStated.length > 0),
  }
}

function limitsOf(query: CatalogueQuery): Limits {
  const limits: Limits = {
    budget: query['max-price'],
    currency: CURRENCY,
    minDiagonal: query['min-size'],
    maxDiagonal: query['max-size'],
    maxWeight: query['max-weight'],
    pen: query.pen,
    colour: query.colour,
    frontLight: query['front-light'],
    water: query.water,
    onSale: query['on-sale'],
  }
  return limits
}

/** Small letters without their marks, so that "café" is found by "cafe". */
function plain(text: string): string {
  return text.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase()
}

const wordsIn = (text: string) => plain(text).split(/\s+/).filter(Boolean)

/**
 * The filters of a query, in the order of its address.
 * @param makers the makers of the list, whose names stand for their keys
 */
export function filtersIn(query: CatalogueQuery, makers: readonly string[]): FilterInForce[] {
  return FILTER_KEYS.flatMap((key): FilterInForce[] => {
    if (key === 'maker') {
      return (query.maker ?? []).map((value) => ({
        key,
        value,
        name: makers.find((name) => makerKey(name) === value) ?? value,
      }))
    }
    const value = query[key]
    return value === undefined || value === '' ? [] : [{ key, value } as FilterInForce]
  })
}

/** The same list without one of its filters, from its first page. */
export function withoutFilter(query: CatalogueQuery, { key, value }: FilterInForce): CatalogueQuery {
  const { page: _, [key]: now, ...rest } = query
  if (key !== 'maker') return rest
  const others = (now as string[]).filter((one) => one !== value)
  return others.length > 0 ? { ...rest, maker: others } : rest
}

/** The same list without any filter. */
export function withoutFilters({ sort, order }: CatalogueQuery): CatalogueQuery {
  return { sort, order }
}

/** How many devices a filter by itself is known to rule out, and how many are left where it alone is taken away. */
export type Toll = { key: FilterKey; ruledOut: number; leftWithout: number }

/** What each kind of filter in force costs, the dearest first; all makers together are one. */
export function tolls(devices: readonly EditionDevice[], query: CatalogueQuery): Toll[] {
  const left = (asked: CatalogueQuery) => {
    const { known, open } = filterDevices(devices, asked)
    return known.length + open.length
  }
  return FILTER_KEYS.filter((key) => query[key] !== undefined)
    .map((key) => {
      const { [key]: alone, ...others } = query
      return { key, ruledOut: devices.length - left({ [key]: alone }), leftWithout: left(others) }
    })
    .sort((one, other) => other.ruledOut - one.ruledOut)
}
