/** Items a feed holds at most, the newest first. */
export const NEWS_LIMIT = 50

/** The year the guide's addresses were first used; part of every tag, so that a tag stays what it is (RFC 4151). */
const TAG_YEAR = '2026'

/** The moment a feed without any news was last changed: the beginning of that year. */
const BEGINNING = new Date('2026-01-01T00:00:00Z')

/** Something the guide published, as both feeds tell it. */
export type NewsItem = {
  /** The part of its tag that names it: `editions/2`. Never changes, never used for another. */
  name: string
  kind: 'edition' | 'correction' | 'device'
  title: string
  text: string
  /** Where it is told in full. */
  path: `/${string}`
  published: Date
  /** When what it says last changed. */
  updated: Date
}

/** What the feeds are told of: rows of db/queries/news.ts. Days are ISO 8601 dates, from midnight UTC. */
export type Published = {
  editions: readonly { number: number; title: string; note: string; publishedAt: Date }[]
  corrections: readonly {
    id: number
    device: string
    figure: string
    note: string
    notedOn: string
    rightIn: number | null
    rightAt: Date | null
    repliedOn: readonly string[]
  }[]
  devices: readonly {
    slug: string
    name: string
    maker: string
    units: number
    provisional: boolean
    edition: number
    publishedAt: Date
    /** Whether the newest edition has it; only then does it have a page. */
    listed: boolean
  }[]
}

/** The newest news, the last changed first; what changed at one moment goes by name. */
export function newsItems({ editions, corrections, devices }: Published): NewsItem[] {
  const items = [...editions.map(ofEdition), ...corrections.map(ofCorrection), ...devices.map(ofDevice)]
  items.sort((one, other) => other.updated.getTime() - one.updated.getTime() || (one.name < other.name ? -1 : 1))
  return items.slice(0, NEWS_LIMIT)
}

/** When the news as a whole last changed. */
export function newsUpdated(items: readonly NewsItem[]): Date {
  return items[0]?.updated ?? BEGINNING
}

/**
 * A tag URI for something of this site, stable whatever its address becomes (RFC 4151).
 * @param host the host name people reach the site at, without a port
 */
export function tagOf(host: string, name: string): string {
  return `tag:${host},${TAG_YEAR}:${name}`
}

function ofEdition({ number, title, note, publishedAt }: Published['editions'][number]): NewsItem {
  return {
    name: `editions/${number}`,
    kind: 'edition',
    title: `${title} is released`,
    text: note,
    path: `/editions/${number}`,
    published: publishedAt,
    updated: publishedAt,
  }
}

function ofCorrection(row: Published['corrections'][number]): NewsItem {
  const noted = new Date(row.notedOn)
  const later = row.repliedOn.map((day) => new Date(day))
  const newest = [noted, ...later, ...(row.rightAt ? [row.rightAt] : [])]
  const putRight =
    row.rightIn === null ? 'It is not put right in an edition yet.' : `It is put right in edition ${row.rightIn}.`
  return {
    name: `corrections/${row.id}`,
    kind: 'correction',
    title: `Correction: ${row.device}, ${lowerFirst(row.figure)}`,
    text: `${row.note} ${putRight}`,
    path: `/corrections#correction-${row.id}`,
    published: noted,
    updated: new Date(Math.max(...newest.map((moment) => moment.getTime()))),
  }
}

function ofDevice({
  slug,
  name,
  maker,
  units,
  provisional,
  edition,
  publishedAt,
  listed,
}: Published['devices'][number]) {
  const from = units === 1 ? 'one unit' : `${units} units`
  const doubt = provisional ? ' Its figures are provisional until a second unit is read.' : ''
  return {
    name: `devices/${slug}`,
    kind: 'device',
    title: `New in the guide: ${name}`,
    text: `${name}, made by ${maker}, enters with edition ${edition}, read on ${from}.${doubt}`,
    path: listed ? `/devices/${slug}` : `/editions/${edition}`,
    published: publishedAt,
    updated: publishedAt,
  } satisfies NewsItem
}

const lowerFirst = (text: string) => text.charAt(0).toLowerCase() + text.slice(1)
