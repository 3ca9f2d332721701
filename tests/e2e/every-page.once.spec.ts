import { expect, test } from '@playwright/test'
import { THEMES } from '@/lib/look'
import { expectAccessibleIn } from './axe'

/** Every public page the site map names; the map itself is held to the links of the site elsewhere. */
async function publicPaths(fetchText: (path: string) => Promise<string>): Promise<string[]> {
  const map = await fetchText('/sitemap.xml')
  return [...map.matchAll(/<loc>([^<]+)<\/loc>/g)].map(([, address = '']) => new URL(address).pathname)
}

for (const theme of THEMES) {
  test(`every public page is free of accessibility violations in the ${theme} theme`, async ({ page, request }) => {
    test.setTimeout(600_000)
    const paths = await publicPaths(async (path) => (await request.get(path)).text())
    expect(paths.length).toBeGreaterThan(40)
    for (const path of paths) await expectAccessibleIn(page, path, theme)
  })
}
