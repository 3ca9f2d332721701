import { expect, test } from '@playwright/test'
import { scriptBytes } from '@/scripts/lib/page-weight.mjs'
import { cumulativeShift } from '@/scripts/lib/vitals.mjs'

/**
 * Scripts a bare application of the site's versions sends, bytes after gzip: tests/bench/bare weighed in the same way on
 * 1 December 2026, rounded down. `npm run bench:web` weighs it anew beside the site.
 */
const BARE = 135_000
const PAGES = [
  { name: 'home', path: '/', more: 45_000 },
  { name: 'the catalogue', path: '/devices', more: 45_000 },
  { name: 'a device', path: '/devices/tamber-reed-7', more: 45_000 },
  { name: 'a result', path: '/quiz/result?bed-lamp=7&train=4', more: 70_000 },
]
/** A fifth of what is called good (web.dev, CLS: 0.1). House. */
const MOST_SHIFT = 0.02

for (const { name, path, more } of PAGES) {
  test(`${name} sends no more script than a bare application and ${more / 1000} kB`, async ({ page, baseURL }) => {
    const bytes = await scriptBytes(page, new URL(path, baseURL).href)
    expect(bytes).toBeGreaterThan(50_000)
    expect(bytes).toBeLessThanOrEqual(BARE + more)
  })

  test(`nothing on ${name} moves while it loads`, async ({ page }) => {
    await page.addInitScript(() => {
      const seen: { value: number; startTime: number }[] = []
      Object.assign(window, { shifts: seen })
      new PerformanceObserver((list) => {
        for (const entry of list.getEntries() as unknown as {
          value: number
          startTime: number
          hadRecentInput: boolean
        }[])
          if (!entry.hadRecentInput) seen.push({ value: entry.value, startTime: entry.startTime })
      }).observe({ type: 'layout-shift', buffered: true })
    })
    await page.goto(path, { waitUntil: 'networkidle' })
    await page.evaluate(() => document.fonts.ready)
    const shifts = await page.evaluate(() => (window as unknown as { shifts: [] }).shifts)
    expect(cumulativeShift(shifts)).toBeLessThan(MOST_SHIFT)
  })
}
