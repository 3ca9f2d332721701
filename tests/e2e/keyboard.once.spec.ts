import { expect, type Page, test } from '@playwright/test'

const ROOMS = [
  '/',
  '/quiz?step=2',
  '/quiz/result',
  '/devices',
  '/devices/tamber-reed-7',
  '/compare?with=ostler-plain-7,tamber-reed-7',
  '/light',
  '/for/dim-bedroom',
  '/method',
  '/editions/2',
  '/corrections',
  '/data',
  '/glossary',
  '/about',
]

/** What the keyboard can be moved to and is shown; one stop for each group of radio buttons. */
const stops = (page: Page) =>
  page.evaluate(() => {
    const groups = new Set<string>()
    return [
      ...document.querySelectorAll<HTMLElement>(
        'a[href], button, input:not([type=hidden]), select, textarea, summary, [tabindex="0"]',
      ),
    ].filter((element) => {
      if (!element.checkVisibility({ visibilityProperty: true }) || element.matches(':disabled, [tabindex="-1"]'))
        return false
      if (!(element instanceof HTMLInputElement) || element.type !== 'radio') return true
      const group = `${element.form?.id} ${element.name}`
      return groups.has(group) ? false : groups.add(group) && true
    }).length
  })

for (const room of ROOMS) {
  test(`the keyboard reaches everything at ${room}, in order, and shows where it is`, async ({ page }) => {
    // A chart's points are single stops until its script makes them one stop with arrow keys.
    await page.goto(room, { waitUntil: 'networkidle' })
    const expected = await stops(page)
    await page.keyboard.press('Tab')
    await expect(page.getByRole('link', { name: 'Skip to the content' })).toBeFocused()
    const faults: string[] = []
    let reached = 0
    for (; reached < expected + 20; reached += 1) {
      const at = await page.evaluate(() => {
        const element = document.activeElement
        if (!(element instanceof Element) || element === document.body) return null
        const { outlineStyle, outlineWidth } = getComputedStyle(element)
        const box = element.getBoundingClientRect()
        return {
          name: element.outerHTML.slice(0, 120),
          ringed: outlineStyle !== 'none' && Number.parseFloat(outlineWidth) >= 1,
          shown: box.width > 0 && box.height > 0 && box.bottom > 0 && box.top < innerHeight,
        }
      })
      if (!at) break
      if (!at.ringed) faults.push(`no ring: ${at.name}`)
      if (!at.shown) faults.push(`out of sight: ${at.name}`)
      await page.keyboard.press('Tab')
    }
    expect(faults).toEqual([])
    // The browser moves on to its own window after the last; nothing of the page may be left out or hold the focus.
    expect(reached).toBe(expected)
  })
}
