// `npm run bench:web`: the pages' speed beside a bare Next.js application of the same versions, in one run: requests a
// second, scripts sent, and LCP, CLS and INP on a slow phone. Ends with 1 where a target is missed.
//   BENCH_ROUNDS=5 BENCH_SECONDS=2   how often each is measured, and how long each load lasts
//   BENCH_URL=http://…               a site that already runs, in place of one built and started here
import { chromium } from '@playwright/test'
import { bareOfSize, buildBare, removeBare, startBare } from './lib/bare.mjs'
import { ensureDebianPackage } from './lib/debian.mjs'
import { load } from './lib/load.mjs'
import { median } from './lib/median.mjs'
import { ensurePackages } from './lib/packages.mjs'
import { scriptBytes } from './lib/page-weight.mjs'
import { freePort } from './lib/ports.mjs'
import { dropDatabase, ensureDatabase, ensurePostgres, startCluster } from './lib/postgres.mjs'
import { atEnd, stopEverything, stopOnSignals } from './lib/processes.mjs'
import { buildSite, startSite, tsx } from './lib/site.mjs'
import { sayAndExit, step } from './lib/steps.mjs'
import { table, verdict } from './lib/verdicts.mjs'
import { vitals } from './lib/vitals.mjs'

const ROUNDS = Number(process.env.BENCH_ROUNDS || 5)
const SECONDS = Number(process.env.BENCH_SECONDS || 2)

const HOME = { name: 'home', path: '/' }
const CATALOGUE = { name: 'catalogue', path: '/devices' }
const DEVICE = { name: 'device', path: '/devices/tamber-reed-7' }
const METHOD = { name: 'method', path: '/method' }
const RESULT = { name: 'result', path: '/quiz/result?bed-lamp=7&train=4' }

/** What the pages may be, beside the bare application. */
const LEAST_SHARE = 0.8
const MORE_SCRIPT = { home: 45_000, catalogue: 45_000, device: 45_000, result: 70_000 }
const MOST_TIMES = 1.5
const MOST_SHIFT = 0.02

/** What a reader taps first, in this order; what a page does not have is passed over. */
const TAPS = ['main button', 'main summary', 'main label', 'main a']

const verdicts = []

async function bench() {
  const site = await ourSite()
  const bare = await bareApplication()
  const pages = [HOME, CATALOGUE, DEVICE, METHOD, RESULT]
  for (const page of pages) {
    page.ours = site + page.path
    Object.assign(page, await warm(page.ours))
    page.bare = bare + (await bareOfSize(bare, page.bytes))
    await warm(page.bare)
  }
  console.log(`\nRequests a second, ${ROUNDS} rounds of ${SECONDS} s each`)
  for (const page of [HOME, CATALOGUE, DEVICE, METHOD]) await compareLoad(page)
  const browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu'],
  })
  atEnd(() => browser.close())
  console.log('\nScripts sent, bytes after gzip')
  for (const page of [HOME, CATALOGUE, DEVICE, RESULT]) await compareScripts(browser, page)
  console.log(`\nOn a processor four times slower and slow 4G, ${ROUNDS} rounds`)
  for (const page of [HOME, CATALOGUE, DEVICE, RESULT]) await compareVitals(browser, page)
  console.log(`\n${table(verdicts)}`)
  return verdicts.every(({ met }) => met)
}

/** Our site: the one named, or built and started on a database of its own with the demo data. */
async function ourSite() {
  if (process.env.BENCH_URL) return process.env.BENCH_URL
  await step('npm packages', ensurePackages)
  await step('Debian’s Chromium', () => ensureDebianPackage('chromium', '/usr/bin/chromium'))
  await step('Debian’s PostgreSQL', ensurePostgres)
  const name = `lampleaf_bench_${process.pid}`
  let databaseUrl
  await step('Database', async () => {
    const server = await startCluster()
    databaseUrl = await ensureDatabase(server.url, name, { anew: true })
    atEnd(() => dropDatabase(server.url, name))
    await tsx('db/migrate.ts', { DATABASE_URL: databaseUrl })
    await tsx('seed/load.ts', { DATABASE_URL: databaseUrl })
  })
  await step('Build', () => buildSite({ distDir: '.next-bench' }))
  const port = await freePort(4600)
  const env = { DATABASE_URL: databaseUrl, LAMPLEAF_DEMO: '1', BASE_URL: `http://127.0.0.1:${port}` }
  return step('Site', () => startSite({ distDir: '.next-bench', port, env }))
}

async function bareApplication() {
  atEnd(removeBare)
  await step('The bare application', async () => void (await buildBare()))
  return startBare(await freePort(4700))
}

/** Fetches a page until it comes from the cache, if it ever does; its bytes, and whether it did. */
async function warm(url) {
  for (let i = 0; i < 3; i++) {
    const answer = await fetch(url)
    if (!answer.ok) throw new Error(`${url} answered ${answer.status}`)
    const { byteLength } = await answer.arrayBuffer()
    if (i === 2) return { bytes: byteLength, cached: /HIT|STALE/.test(answer.headers.get('x-nextjs-cache') ?? '') }
  }
}

async function compareLoad(page) {
  const [ours, bare] = [[], []]
  await load(page.ours, { seconds: 1 })
  await load(page.bare, { seconds: 1 })
  for (let round = 0; round < ROUNDS; round++) {
    // One after the other, so that whatever else the machine does falls on both.
    for (const [url, figures] of [
      [page.ours, ours],
      [page.bare, bare],
    ]) {
      const { perSecond, failures } = await load(url, { seconds: SECONDS })
      if (failures > 0) throw new Error(`${url} failed ${failures} times`)
      figures.push(perSecond)
    }
  }
  const share = median(ours.map((figure, round) => figure / bare[round]))
  console.log(
    `${page.name}: ${median(ours).toFixed(0)} beside ${median(bare).toFixed(0)}, ${page.bytes} bytes ${page.cached ? 'from' : 'not from'} the cache`,
  )
  verdicts.push(verdict(`${page.name}: requests, share of the bare page’s`, share, { least: LEAST_SHARE }, '', 2))
}

async function compareScripts(browser, page) {
  const weigh = async (url) => {
    const context = await browser.newContext()
    return scriptBytes(await context.newPage(), url).finally(() => context.close())
  }
  const [ours, bare] = [await weigh(page.ours), await weigh(page.bare)]
  console.log(`${page.name}: ${ours}, ${ours - bare} more than the bare application’s ${bare}`)
  verdicts.push(
    verdict(
      `${page.name}: scripts beyond the bare`,
      (ours - bare) / 1000,
      { most: MORE_SCRIPT[page.name] / 1000 },
      'kB',
      1,
    ),
  )
}

async function compareVitals(browser, page) {
  const [ours, bare] = [[], []]
  for (let round = 0; round < ROUNDS; round++) {
    ours.push(await vitals(browser, page.ours, TAPS))
    bare.push(await vitals(browser, page.bare, TAPS))
  }
  const middle = (figures, name) => median(figures.map((figure) => figure[name]))
  const say = (figures) => `LCP ${middle(figures, 'lcp').toFixed(0)} ms, INP ${middle(figures, 'inp').toFixed(0)} ms`
  console.log(`${page.name}: ${say(ours)}; bare: ${say(bare)}`)
  for (const name of ['lcp', 'inp']) {
    const times = middle(ours, name) / middle(bare, name)
    verdicts.push(
      verdict(`${page.name}: ${name.toUpperCase()}, times the bare page’s`, times, { most: MOST_TIMES }, '', 2),
    )
  }
  verdicts.push(verdict(`${page.name}: CLS`, middle(ours, 'cls'), { most: MOST_SHIFT }, '', 3))
}

stopOnSignals()
try {
  const met = await bench()
  await stopEverything()
  process.exit(met ? 0 : 1)
} catch (error) {
  await stopEverything()
  sayAndExit(error)
}
