import AxeBuilder from '@axe-core/playwright'
import { expect, type Page, test } from '@playwright/test'

const THEMES = ['day', 'night', 'paper'] as const
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']

/** Axe finds nothing on this page in any of the three themes, nor does the page scroll sideways. */
export async function expectAccessible(page: Page, path: string): Promise<void> {
  const { baseURL } = test.info().project.use
  const url = new URL(path, baseURL)
  for (const theme of THEMES) {
    await page.context().addCookies([{ name: 'look', value: `${theme}-metric`, url: url.origin }])
    await page.goto(url.href)
    const { violations } = await new AxeBuilder({ page }).withTags(RULES).analyze()
    expect(
      violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' ')}`),
      `${path} in the ${theme} theme`,
    ).toEqual([])
    const sideways = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    )
    expect(sideways, `${path} scrolls sideways in the ${theme} theme`).toBe(0)
  }
}
