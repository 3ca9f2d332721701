import AxeBuilder from '@axe-core/playwright'
import { expect, type Page, test } from '@playwright/test'
import { THEMES, type Theme } from '@/lib/look'

const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']

/** Axe finds nothing on this page in any of the three themes, nor does the page scroll sideways. */
export async function expectAccessible(page: Page, path: string): Promise<void> {
  for (const theme of THEMES) await expectAccessibleIn(page, path, theme)
}

/** The same in one theme. */
export async function expectAccessibleIn(page: Page, path: string, theme: Theme): Promise<void> {
  const url = new URL(path, test.info().project.use.baseURL)
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
