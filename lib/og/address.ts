import type { Edition } from '@/lib/method/types'
import { READERS } from '@/lib/readers/readers'
import { HEIGHT, WIDTH } from './picture'

/** A picture by what it shows. */
export type Subject =
  | { kind: 'home' | 'edition' | 'method' }
  | { kind: 'device'; slug: string }
  | { kind: 'reader'; slug: string }

/** An edition's number. One address for each: no signs, no leading zeros, nothing a database's integer cannot hold. */
const NUMBER = /^[1-9]\d{0,8}$/

const PAGES: Record<string, 'home' | 'edition' | 'method'> = {
  'home.png': 'home',
  'edition.png': 'edition',
  'method.png': 'method',
}

/**
 * The picture of a page for its metadata. A page without one of its own shows the site's. Its address names the edition,
 * so it may be kept for ever.
 * @param path the page's public path
 * @param edition the edition the page shows; null: there is none, so there is nothing to draw
 */
export function ogImage(path: string, edition: Pick<Edition, 'number' | 'devices'> | null) {
  if (!edition) return []
  const { number = String(edition.number), file, alt } = pictureOf(path, edition)
  return [{ url: `/og/${number}/${file}`, width: WIDTH, height: HEIGHT, type: 'image/png', alt }]
}

type Named = { number?: string; file: string; alt: string }

function pictureOf(path: string, { devices }: Pick<Edition, 'devices'>): Named {
  const [, room, slug] = path.split('/')
  const device = room === 'devices' ? devices.find((one) => one.slug === slug) : undefined
  if (device) return { file: `devices/${device.slug}.png`, alt: `${device.name}: its page in its measured colour` }
  const reader = room === 'for' ? READERS.find((one) => one.slug === slug) : undefined
  if (reader) return { file: `for/${reader.slug}.png`, alt: `Picks for a typical reader: ${reader.name}` }
  // The page of an earlier edition has that edition's own picture.
  if (room === 'editions' && slug && NUMBER.test(slug))
    return { number: slug, file: 'edition.png', alt: `Edition ${slug} of Lampleaf` }
  if (room === 'method') return { file: 'method.png', alt: 'How Lampleaf measures a page' }
  return { file: 'home.png', alt: 'Lampleaf: measured pages of electronic-paper reading devices' }
}

/** The edition and the subject of a picture's address, after `/og/`; null: no picture has that address. */
export function readAddress(parts: readonly string[]): { edition: number; subject: Subject } | null {
  const [number = '', first = '', last, ...rest] = parts
  if (!NUMBER.test(number) || rest.length > 0) return null
  const edition = Number(number)
  if (last === undefined) {
    const kind = Object.hasOwn(PAGES, first) ? PAGES[first] : undefined
    return kind ? { edition, subject: { kind } } : null
  }
  const slug = /^([a-z0-9]+(?:-[a-z0-9]+)*)\.png$/.exec(last)?.[1]
  if (!slug) return null
  if (first === 'devices') return { edition, subject: { kind: 'device', slug } }
  if (first === 'for') return { edition, subject: { kind: 'reader', slug } }
  return null
}
