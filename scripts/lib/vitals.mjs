/** Slow 4G as page tests have it: round trip in milliseconds, bytes a second down and up. */
const SLOW_4G = { latency: 150, downloadThroughput: 1_600_000 / 8, uploadThroughput: 750_000 / 8 }
const CPU_SLOWDOWN = 4
/** House: how long one looks at least before one taps, milliseconds. */
const LOOK_MS = 400

/**
 * Watches a page from its first moment; runs in the page. LCP is the last candidate before the first interaction, CLS
 * the largest session window, INP the longest interaction (web.dev/articles/vitals; few interactions, so the longest).
 */
function watch() {
  const seen = { lcp: 0, shifts: [], interactions: new Map() }
  window.lampleafVitals = seen
  const observe = (type, take, more) =>
    new PerformanceObserver((list) => list.getEntries().forEach(take)).observe({ type, buffered: true, ...more })
  observe('largest-contentful-paint', (entry) => {
    seen.lcp = entry.startTime
  })
  observe('layout-shift', ({ value, startTime, hadRecentInput }) => {
    if (!hadRecentInput) seen.shifts.push({ value, startTime })
  })
  const interaction = ({ interactionId, duration }) => {
    if (interactionId)
      seen.interactions.set(interactionId, Math.max(duration, seen.interactions.get(interactionId) ?? 0))
  }
  observe('event', interaction, { durationThreshold: 16 })
  observe('first-input', interaction)
  // Another page has vitals of its own: what would lead away is stopped, before anything of the page's own hears of it.
  addEventListener('submit', (event) => event.preventDefault(), true)
  addEventListener('click', (event) => event.target.closest?.('a') && event.preventDefault(), true)
}

/**
 * The largest sum of shifts in a window of at most five seconds with gaps under one second.
 * @param shifts by time; `startTime` in milliseconds
 */
export function cumulativeShift(shifts) {
  let [worst, sum, first, last] = [0, 0, Number.NEGATIVE_INFINITY, Number.NEGATIVE_INFINITY]
  for (const { value, startTime } of shifts) {
    const goesOn = startTime - last < 1000 && startTime - first < 5000
    sum = goesOn ? sum + value : value
    if (!goesOn) first = startTime
    last = startTime
    worst = Math.max(worst, sum)
  }
  return worst
}

/**
 * Loads a page on a slow phone's processor and network in a fresh context, then does what a reader does first: the tab
 * key, and a tap on the first of each of the given selectors; those that find nothing are passed over.
 * @returns LCP and INP in milliseconds, CLS
 */
export async function vitals(browser, url, taps) {
  const context = await browser.newContext({ viewport: { width: 412, height: 823 }, locale: 'en-GB' })
  try {
    const page = await context.newPage()
    await page.addInitScript(watch)
    const session = await context.newCDPSession(page)
    await session.send('Network.enable')
    await session.send('Network.emulateNetworkConditions', { offline: false, ...SLOW_4G })
    await session.send('Emulation.setCPUThrottlingRate', { rate: CPU_SLOWDOWN })
    await page.goto(url, { waitUntil: 'load' })
    await page.waitForLoadState('networkidle')
    await page.waitForTimeout(500)
    const { lcp } = await page.evaluate(() => window.lampleafVitals)
    await page.keyboard.press('Tab')
    for (const selector of taps) await tap(page, selector)
    await page.waitForTimeout(500)
    const seen = await page.evaluate(() => ({
      shifts: window.lampleafVitals.shifts,
      interactions: [...window.lampleafVitals.interactions.values()],
    }))
    if (lcp === 0 || seen.interactions.length === 0) throw new Error(`${url} showed nothing or answered no touch`)
    return { lcp, cls: cumulativeShift(seen.shifts), inp: Math.max(...seen.interactions) }
  } finally {
    await context.close()
  }
}

/** Taps what a selector finds first, where a finger could: a control under another is passed over. */
async function tap(page, selector) {
  const control = page.locator(selector).filter({ visible: true }).first()
  if ((await control.count()) === 0) return
  // A reader scrolls, looks, and then taps.
  await control.scrollIntoViewIfNeeded()
  await page.waitForTimeout(LOOK_MS)
  await control.click({ timeout: 5000 }).catch((error) => {
    if (error.name !== 'TimeoutError') throw error
  })
}
