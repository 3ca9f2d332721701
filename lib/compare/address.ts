import { clip } from '@/lib/contract/shown'

/** Devices one can see side by side. */
export const MOST_COMPARED = 4
/** Names read of an address; no form of ours sends more. */
const MOST_READ = 100

/** The devices an address names, in its order, as they stand there: blanks left out, doubles kept. */
export function readCompared(given: string | string[] | undefined): string[] {
  const texts = given === undefined ? [] : [given].flat()
  return texts
    .flatMap((text) => text.split(','))
    .map((part) => clip(part.trim()))
    .filter((part) => part !== '')
    .slice(0, MOST_READ)
}

/** The address that compares these; no device is the empty room. */
export function compareHref(slugs: readonly string[]): string {
  if (slugs.length === 0) return '/compare'
  return `/compare?${new URLSearchParams({ with: slugs.join(',') })}`.replaceAll('%2C', ',')
}

/** What is made of the names in an address. */
export type Choice<Device> = {
  /** At most four, each once, in the order named. */
  chosen: Device[]
  /** Named, but one too many. */
  left: Device[]
  /** Named more than once, and shown once. */
  twice: Device[]
  /** Names of no device of the edition. */
  unknown: string[]
}

/** Finds the devices an address names. */
export function chooseDevices<Device extends { slug: string }>(
  devices: readonly Device[],
  named: readonly string[],
): Choice<Device> {
  const once = [...new Set(named)]
  const find = (slug: string) => devices.find((device) => device.slug === slug)
  const found = once.map(find).filter((device) => device !== undefined)
  return {
    chosen: found.slice(0, MOST_COMPARED),
    left: found.slice(MOST_COMPARED),
    twice: found.filter(({ slug }) => named.filter((name) => name === slug).length > 1),
    unknown: once.filter((slug) => !find(slug)),
  }
}

/**
 * The one order of these devices that the pages to be found by search name as theirs: any order may be looked at, and
 * all show the same.
 */
export function inFindableOrder(slugs: readonly string[]): string[] {
  return [...slugs].sort()
}

/** Every pair of a few devices, each once, in their order. */
export function pairsOf<Item>(items: readonly Item[]): [Item, Item][] {
  return items.flatMap((one, i) => items.slice(i + 1).map((other): [Item, Item] => [one, other]))
}
