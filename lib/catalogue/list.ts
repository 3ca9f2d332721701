import { publishedFigures } from '@/lib/findings/published'
import type { Edition } from '@/lib/method/types'
import { filterDevices } from './filters'
import type { CatalogueQuery } from './schema'
import { type DeviceRow, sortFor, sortRows } from './sort'

/** A device of a list, with the fields asked for that it does not state. */
export type ListedDevice = DeviceRow & { notStated: string[] }

/** Devices known to match come first in their order, then those not ruled out in theirs. */
export type DeviceList = { known: ListedDevice[]; open: ListedDevice[] }

// The figures of a released edition never change, and their doubts take a while to work out.
const figuresOf = new WeakMap<Edition, Map<string, DeviceRow['figures']>>()

function figures(edition: Edition): Map<string, DeviceRow['figures']> {
  const known = figuresOf.get(edition)
  if (known) return known
  const fresh = new Map(edition.devices.map((device) => [device.slug, publishedFigures(edition, device)]))
  figuresOf.set(edition, fresh)
  return fresh
}

/** The devices of an edition that a query finds, in the order it asks for. */
export function listDevices(edition: Edition, query: CatalogueQuery): DeviceList {
  const sort = sortFor(query)
  const all = figures(edition)
  const { known, open } = filterDevices(edition.devices, query)
  return {
    known: sortRows(
      known.map((device) => ({ device, figures: all.get(device.slug)!, notStated: [] })),
      sort,
    ),
    open: sortRows(
      open.map(({ device, notStated }) => ({ device, figures: all.get(device.slug)!, notStated })),
      sort,
    ),
  }
}

/** The part of a list that stands on one of its numbered pages; past the last page, the last. */
export function pageOf<Item>(
  items: readonly Item[],
  page: number,
  perPage: number,
): { items: Item[]; page: number; pages: number } {
  const pages = Math.max(1, Math.ceil(items.length / perPage))
  const shown = Math.min(page, pages)
  return { items: items.slice((shown - 1) * perPage, shown * perPage), page: shown, pages }
}
