import { expect, test } from 'vitest'
import { derivedUncertainty, expandedFigure } from '@/lib/method/figure-doubts'
import { budgetParts, combined, effectiveDegrees, expanded, largestOf, ownPart } from '@/lib/workings/budget'
import { countsOf, degreesOf } from '@/lib/workings/counts'
import { deviceBudget } from '@/lib/workings/device-budget'
import gum from '@/tests/reference/gum.json'

type Component = { u: number; df: number | null; sensitivity?: number }
const find = (id: string) =>
  gum.cases.find((entry) => entry.id === id) as unknown as {
    input: { components: Component[] }
    expected: { u_c: number; df_eff: number }
  }

// JCGM 100:2008, G.4.1, from memory, and H.1, read (gum.json).
test('the guide’s effective degrees of freedom come out of its components', () => {
  const { input, expected } = find('gum-g.4.1-welch-satterthwaite')
  const degrees = effectiveDegrees(input.components.map(({ u, df }) => ({ u, degrees: df })))
  expect(degrees).toBeCloseTo(expected.df_eff, 6)
})
test('a part without stated degrees counts as without end', () => {
  expect(effectiveDegrees([{ u: 0.25, degrees: null }])).toBe(Infinity)
  // By hand: u⁴ of 1 and 1 is 4, over 1⁴/10: 40.
  expect(
    effectiveDegrees([
      { u: 1, degrees: 10 },
      { u: 1, degrees: null },
    ]),
  ).toBeCloseTo(40, 9)
})

const lab = (L: number, a: number, b: number) => ({ L, a, b })
const components = {
  page: { reading: lab(0.05, 0.02, 0.02), position: lab(0.14, 0.05, 0.08), unit: lab(0.36, 0.14, 0.14) },
  ink: { reading: lab(0.04, 0.02, 0.02), position: lab(0.11, 0.03, 0.05), unit: lab(0.24, 0.08, 0.15) },
}
const uncertainty = { common: lab(0.25, 0.1, 0.12), session: lab(0.1, 0.03, 0.05) }
const counts = { page: { units: 2, sets: 6, readings: 32 }, ink: { units: 2, sets: 6, readings: 30 } }
const sessions = { one: 0.5, two: 0.5 }

// Method 1, section 1, by hand: u² = 0.36²/2 + 0.14²/6 + 0.05²/32, U = 2·√(u² + 0.1²·0.5 + 0.25²).
test('a budget combines as the method writes it', () => {
  const parts = budgetParts({ components, ...uncertainty, counts, togetherness: Math.SQRT1_2, degrees: {} })
  const own = Math.sqrt(0.36 ** 2 / 2 + 0.14 ** 2 / 6 + 0.05 ** 2 / 32)
  expect(ownPart(parts, 'page').L).toBeCloseTo(own, 12)
  const all = Math.sqrt(own ** 2 + 0.1 ** 2 * 0.5 + 0.25 ** 2)
  expect(combined(parts, 'page').L).toBeCloseTo(all, 12)
  expect(expanded(parts, 'page').L).toBeCloseTo(2 * all, 12)
  expect(expanded(parts, 'page').L).toBeCloseTo(expandedFigure(own, 0.1, sessions, 0.25), 12)
  expect(parts.map(({ id, type }) => `${id} ${type}`)).toEqual([
    'reading A',
    'position A',
    'unit A',
    'session A',
    'common B',
  ])
})

// The lines of the budget against the propagation that publishes the doubts (JCGM 100, 5.1.2), which takes other slopes.
test('what the lines bring to whiteness, tint and contrast adds up to the published doubt', () => {
  const own = (state: 'page' | 'ink') =>
    ownPart(budgetParts({ components, ...uncertainty, counts, togetherness: 1, degrees: {} }), state)
  const page = { ...lab(70, -1.5, 1.5), u: own('page') }
  const ink = { ...lab(23, -0.3, -0.8), u: own('ink') }
  const budget = deviceBudget({ page, ink, sessions }, uncertainty, { components, degrees: {} }, counts)
  const published = derivedUncertainty({ page, ink, sessions }, uncertainty)
  for (const figure of ['whiteness', 'tint', 'contrast'] as const) {
    expect(budget.figures[figure].expanded / published[figure], figure).toBeCloseTo(1, 4)
  }
  expect(budget.figures.lightness.expanded).toBeCloseTo(budget.expanded.L, 12)
})

test('the largest part is named with its share of the variance', () => {
  // By hand: 0.3² of 0.3² + 0.4² is 36 %, the other 64 %.
  expect(
    largestOf([
      { id: 'reading', u: 0.3 },
      { id: 'common', u: 0.4 },
    ]),
  ).toEqual({ id: 'common', share: expect.closeTo(0.64, 12) })
  expect(largestOf([{ id: 'reading', u: 0 }])).toBeNull()
})

test('counts and degrees of freedom are those of the sets', () => {
  const set = (slug: string, unit: string, id: number, readings: number, state: 'page' | 'ink' = 'page') => ({
    slug,
    unit,
    set: id,
    session: 's',
    state,
    readings,
  })
  const sets = [
    set('a', 'a1', 1, 5),
    set('a', 'a1', 2, 6),
    set('a', 'a2', 3, 5),
    set('b', 'b1', 4, 5),
    set('a', 'a1', 5, 5, 'ink'),
  ]
  expect(countsOf(sets, 'a')).toEqual({
    page: { units: 2, sets: 3, readings: 16 },
    ink: { units: 1, sets: 1, readings: 5 },
  })
  // By hand: 21 readings − 4 sets, 4 sets − 3 units, 3 units − 2 models, 22 sessions − 1.
  expect(degreesOf(sets, 'page', [22])).toEqual({ reading: 17, position: 1, unit: 1, session: 21 })
  expect(degreesOf([set('a', 'a1', 1, 5)], 'page', [])).toEqual({ reading: 4 })
})
