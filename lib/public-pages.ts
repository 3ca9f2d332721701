import type { Edition } from '@/lib/method/types'
import { READERS } from '@/lib/readers/readers'

/** When what pages show last changed, apart from the release of the newest edition. ISO 8601, UTC. */
export type Changes = {
  /** Every released edition. */
  editions: readonly { number: number; publishedAt: string }[]
  /** By slug: the newest correction, reply, price or reading of a device. */
  devices: ReadonlyMap<string, string>
  /** The newest correction or reply; null: none yet. */
  corrections: string | null
}

/** A public page; `changed` is null where nobody can say when it last changed. */
export type PublicPage = { path: `/${string}`; changed: string | null }

/** Rooms whose words change with the site, not with an edition: no true date is known. */
const UNDATED = ['/quiz', '/data/api', '/glossary', '/about'] as const
/** Rooms that show the figures of the newest edition. */
const OF_EDITION = [
  '/',
  '/devices',
  '/compare',
  '/light',
  '/for',
  '/method',
  '/method/try',
  '/editions',
  '/data',
] as const

/**
 * Every public page, once: for the site map, and for whoever fetches them all after a release so that each is stored.
 * The later pages of a long list follow from its first and are not named.
 * @param edition the newest; null while none has been released: the rooms are there, devices and editions are not
 */
export function publicPages(edition: Edition | null, changes: Changes): PublicPage[] {
  const released = edition?.publishedAt ?? null
  const page = (path: `/${string}`, ...moments: (string | null | undefined)[]): PublicPage => ({
    path,
    changed: newest(moments),
  })
  return [
    ...OF_EDITION.map((path) => page(path, released)),
    ...(edition?.devices ?? []).flatMap(({ slug }) => [
      page(`/devices/${slug}`, released, changes.devices.get(slug)),
      page(`/devices/${slug}/readings`, released, changes.devices.get(slug)),
    ]),
    ...READERS.map(({ slug }) => page(`/for/${slug}`, released)),
    // An edition's own page never changes, but for the corrections that name it.
    ...changes.editions.flatMap(({ number, publishedAt }) => [
      page(`/editions/${number}`, publishedAt, changes.corrections),
      page(`/data/${number}`, publishedAt),
    ]),
    page('/corrections', changes.corrections, released),
    ...UNDATED.map((path) => page(path)),
  ]
}

/** The addresses of every public page. */
export function publicPaths(edition: Edition | null, editions: Changes['editions']): string[] {
  return publicPages(edition, { editions, devices: new Map(), corrections: null }).map(({ path }) => path)
}

function newest(moments: readonly (string | null | undefined)[]): string | null {
  const known = moments.flatMap((moment) => (moment ? [Date.parse(moment)] : []))
  return known.length === 0 ? null : new Date(Math.max(...known)).toISOString()
}
