import { expect, test } from '@playwright/test'
import { each, listedPaths, type Read, readHtml } from './crawl'

/** Addresses followed at most, and of one path with different queries. House. */
const MOST = 900
const MOST_QUERIES = 3

type Visit = { status: number; page: Read | null; from: string }
type Link = { to: string; fragment: string; from: string }

test('every link leads somewhere, and every page says what it is', async ({ page, request, baseURL }) => {
  const origin = new URL(baseURL!).origin
  const visits = new Map<string, Visit>()
  const queries = new Map<string, number>()
  const links: Link[] = []
  const wrong: string[] = []

  const isNew = (address: string) => {
    if (visits.has(address) || visits.size >= MOST) return false
    const { pathname, search } = new URL(address, origin)
    if (search === '') return true
    const seen = queries.get(pathname) ?? 0
    queries.set(pathname, seen + 1)
    return seen < MOST_QUERIES
  }
  const visit = async ({ to, from }: Link): Promise<Link[]> => {
    const answer = await request.get(to)
    const isPage = answer.ok() && (answer.headers()['content-type'] ?? '').startsWith('text/html')
    const read = isPage ? await readHtml(page, await answer.text()) : null
    visits.set(to, { status: answer.status(), page: read, from })
    return [...(read?.links ?? []), ...(read?.related ?? []).map((one) => one.href)].flatMap((href) => {
      const url = URL.canParse(href, answer.url()) ? new URL(href, answer.url()) : null
      if (!url) wrong.push(`${to}: ${href} is no address`)
      if (url?.origin !== origin) return []
      return { to: url.pathname + url.search, fragment: decodeURIComponent(url.hash.slice(1)), from: to }
    })
  }

  let wave: Link[] = ['/', ...(await listedPaths(request))].map((to) => ({ to, fragment: '', from: 'the site map' }))
  while (wave.length > 0) {
    const now = wave.filter(({ to, from }) => isNew(to) && visits.set(to, { status: 0, page: null, from }))
    wave = []
    await each(now, async (link) => void wave.push(...(await visit(link))))
    links.push(...wave)
  }

  expect(visits.size).toBeGreaterThan(20)
  expect(visits.size, 'the site is larger than the checker follows: raise MOST').toBeLessThan(MOST)
  for (const [address, { status, from }] of visits)
    if (status >= 400) wrong.push(`${address}, linked from ${from}, answered ${status}`)
  for (const { to, fragment, from } of links) {
    const ids = visits.get(to)?.page?.ids
    if (fragment && ids && !ids.includes(fragment)) wrong.push(`${to}#${fragment}, linked from ${from}, is not there`)
  }
  expect.soft(wrong, 'dead links').toEqual([])

  const pages = [...visits].flatMap(([address, { page: read }]) => (read ? [{ address, ...read }] : []))
  const those = (isWrong: (page: (typeof pages)[number]) => boolean) =>
    pages.filter(isWrong).map(({ address }) => address)
  expect
    .soft(
      those(({ lang }) => lang !== 'en-GB'),
      'without their language',
    )
    .toEqual([])
  expect
    .soft(
      those(({ headings }) => headings !== 1),
      'without exactly one main heading',
    )
    .toEqual([])
  expect
    .soft(
      those(({ ids }) => new Set(ids).size < ids.length),
      'with one name for two things',
    )
    .toEqual([])
  expect
    .soft(
      those(({ titles: [title = ''], titles }) => titles.length !== 1 || !/Lampleaf/.test(title)),
      'without a title',
    )
    .toEqual([])
  expect
    .soft(
      those(({ descriptions: [text = ''], descriptions }) => descriptions.length !== 1 || text.length < 40),
      'without a description',
    )
    .toEqual([])
  expect
    .soft(
      pages.flatMap(({ unnamed, address }) => unnamed.map((html) => `${address}: ${html}`)),
      'pictures',
    )
    .toEqual([])
  expect
    .soft(
      those(
        ({ related }) => !FEEDS.every((type) => related.some((one) => one.rel === 'alternate' && one.type === type)),
      ),
      'without the feeds',
    )
    .toEqual([])
  expect
    .soft(
      those(({ related }) => !MARKS.every((rel) => related.some((one) => one.rel === rel))),
      'without icons',
    )
    .toEqual([])

  // A result is one reader's own and asks not to be found: only what may be found needs a canonical address.
  const findable = pages.filter(({ robots }) => !/noindex/.test(robots))
  const canonicalOf = ({ canonical }: { canonical: string | null }) => {
    const url = canonical && URL.canParse(canonical) ? new URL(canonical) : null
    return url?.origin === origin ? url.pathname + url.search : null
  }
  const misnamed = findable.filter((one) => {
    const path = canonicalOf(one)
    if (path === null || (!one.address.includes('?') && path !== one.address)) return true
    const target = visits.get(path)?.page
    return target ? canonicalOf(target) !== path : false
  })
  expect
    .soft(
      misnamed.map(({ address, canonical }) => `${address}: ${canonical}`),
      'canonical addresses',
    )
    .toEqual([])

  const plain = findable.filter(({ address }) => !address.includes('?'))
  expect.soft(twice(plain.map(({ titles }) => titles[0])), 'titles of more than one page').toEqual([])
  expect.soft(twice(plain.map(({ descriptions }) => descriptions[0])), 'descriptions of more than one page').toEqual([])
})

const FEEDS = ['application/atom+xml', 'application/feed+json']
const MARKS = ['icon', 'apple-touch-icon', 'manifest']

const twice = <T>(all: T[]): T[] => [...new Set(all.filter((one, place) => all.indexOf(one) !== place))]

test('what the site map lists may be found', async ({ page, request }) => {
  const hidden: string[] = []
  await each(await listedPaths(request), async (path) => {
    const answer = await request.get(path)
    const { robots } = await readHtml(page, await answer.text())
    if (!answer.ok() || /noindex/.test(robots)) hidden.push(`${path}: ${answer.status()} ${robots}`)
  })
  expect(hidden).toEqual([])
})

/** One address of every kind of page the site map does not list. */
const OTHER_KINDS = [
  '/?lux=300',
  '/quiz?step=3',
  '/quiz/result?bed-lamp=7&train=4',
  '/devices?q=tamber',
  '/devices?sort=price&order=asc',
  '/compare?with=tamber-reed-7,wexby-vesper-8',
  '/light?lux=8',
]
/** The work is shared out, so that pages are opened side by side. */
const SHARES = 4

for (let share = 0; share < SHARES; share++) {
  test(`no page has an error, or asks for what its policy forbids: ${share + 1} of ${SHARES}`, async ({
    page,
    request,
  }) => {
    const paths = [...(await listedPaths(request)), ...OTHER_KINDS].filter((_, i) => i % SHARES === share)
    let at = ''
    const wrong: string[] = []
    page.on('console', (message) => {
      if (['error', 'warning'].includes(message.type())) wrong.push(`${at}: ${message.text()}`)
    })
    page.on('pageerror', (error) => wrong.push(`${at}: ${error.message}`))
    page.on('response', (answer) => {
      if (answer.status() >= 400) wrong.push(`${at}: ${answer.url()} answered ${answer.status()}`)
    })
    await page.exposeFunction('reportViolation', (what: string) => wrong.push(`${at}: the policy forbids ${what}`))
    await page.addInitScript(() => {
      const report = (window as unknown as { reportViolation: (what: string) => void }).reportViolation
      addEventListener('securitypolicyviolation', (event) =>
        report(`${event.effectiveDirective} ${event.blockedURI} ${event.sample}`),
      )
    })
    for (const path of paths) {
      at = path
      const answer = await page.goto(path, { waitUntil: 'load' })
      const policy = answer?.headers()['content-security-policy']
      if (!policy?.includes("default-src 'none'")) wrong.push(`${path}: its policy is ${policy}`)
      // Whatever starts once the page is alive starts now.
      await page.evaluate(() => new Promise((resolve) => requestIdleCallback(resolve, { timeout: 1000 })))
    }
    expect(wrong).toEqual([])
  })
}
