import { expect, test } from 'vitest'
import { QUANTITIES } from '@/app/[look]/method/quantities'
import { figureList } from '@/lib/findings/figure-list'
import { inkFigures } from '@/lib/findings/ink'
import { publishedFigures } from '@/lib/findings/published'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'

const device = makeDevice({ slug: 'example' })
const edition = makeEdition([device])

test('every listed figure has its entry on the Method page, a unit and a doubt above nothing', () => {
  const known = new Set(QUANTITIES.map(({ id }) => id))
  const listed = figureList(publishedFigures(edition, device))
  expect(listed).toHaveLength(12)
  for (const { method, name, figure, unit } of listed) {
    expect(known, name).toContain(method)
    expect(unit).not.toBe('')
    expect(figure.doubt, name).toBeGreaterThan(0)
  }
})

test('whiteness and tint, and nothing else, are marked as outside their formula’s limits', () => {
  const outside = figureList(publishedFigures(edition, device)).filter((one) => one.outside)
  expect(outside.map(({ method }) => method)).toEqual(['whiteness', 'tint'])
})

test('a neutral page has no hue to list', () => {
  const grey = makeDevice({ slug: 'grey', page: { L: 70, a: 0, b: 0, u: { L: 0.4, a: 0.15, b: 0.2 } } })
  expect(figureList(publishedFigures(edition, grey)).some(({ unit }) => unit === 'degrees')).toBe(false)
})

// Method 1, section 1, by hand: U = 2·√(u² + s_session²·Σ share² + u_common²) with u 0.5, 0.12, shares a half each, 0.25.
test('the ink has its doubts like the page', () => {
  const { lightness } = inkFigures(edition, device)
  expect(lightness.value).toBe(23)
  expect(lightness.doubt).toBeCloseTo(2 * Math.sqrt(0.5 ** 2 + 0.12 ** 2 * 0.5 + 0.25 ** 2), 10)
})
