import { describe, expect, test } from 'vitest'
import { differencesOf } from '@/lib/compare/differences'
import type { Lab } from '@/lib/method/types'
import { makeDevice } from '../../fixtures/edition'

const edition = { uncertainty: { common: { L: 0.5, a: 0.2, b: 0.2 }, session: { L: 0.2, a: 0.1, b: 0.1 } } }
const exact = { uncertainty: { common: { L: 0, a: 0, b: 0 }, session: { L: 0, a: 0, b: 0 } } }

const device = (slug: string, page: Lab, u: Lab, sessions: Record<string, number> = { s1: 1 }) =>
  makeDevice({ slug, page: { ...page, u }, sessions })

// Sharma, Wu, Dalal 2005, table 1: pairs 1 and 17, whose ΔE00 are 2.0425 and 27.1492 (ISO/CIE 11664-6 refers to it).
describe('the colour difference of two pages is CIEDE2000', () => {
  const u = { L: 0.1, a: 0.1, b: 0.1 }
  test.each([
    [{ L: 50, a: 2.6772, b: -79.7751 }, { L: 50, a: 0, b: -82.7485 }, 2.0425],
    [{ L: 50, a: 2.5, b: 0 }, { L: 73, a: 25, b: -18 }, 27.1492],
  ])('%o and %o', (one, other, deltaE00) => {
    const { colour } = differencesOf(exact, device('one', one, u), device('other', other, u))
    expect(colour.deltaE00).toBeCloseTo(deltaE00, 4)
  })
})

// JCGM 100:2008, 5.1.2, by hand: along one channel U = 2·√(u₁² + u₂²); what is common to both drops out, and a session
// both were measured in too (Method 1, section 1).
test('a difference of lightness has the doubt of the two devices’ own parts alone', () => {
  const one = device('one', { L: 72, a: -1, b: 1 }, { L: 0.3, a: 0.1, b: 0.1 })
  const other = device('other', { L: 71.01, a: -1, b: 1 }, { L: 0.4, a: 0.1, b: 0.1 })
  const { lightness } = differencesOf(edition, one, other)
  expect(lightness.by).toBeCloseTo(0.99, 12)
  expect(lightness.doubt).toBeCloseTo(2 * Math.hypot(0.3, 0.4), 6)
  expect(lightness.close).toBe(true)
})

// Between two greys CIEDE2000 is ΔL*/S_L with S_L = 1 + 0.015(L̄ − 50)²/√(20 + (L̄ − 50)²); ISO/CIE 11664-6.
test('along the greys the doubt of a colour difference is that of lightness over S_L', () => {
  const one = device('one', { L: 74, a: 0, b: 0 }, { L: 0.3, a: 0, b: 0 })
  const other = device('other', { L: 66, a: 0, b: 0 }, { L: 0.4, a: 0, b: 0 })
  const { colour } = differencesOf(exact, one, other)
  const sl = (mean: number) => 1 + (0.015 * (mean - 50) ** 2) / Math.sqrt(20 + (mean - 50) ** 2)
  expect(colour.deltaE00).toBeCloseTo(8 / sl(70), 9)
  const slope = (from: number, to: number, step: number) =>
    ((from + step - to) / sl((from + step + to) / 2) - (from - step - to) / sl((from - step + to) / 2)) / (2 * step)
  const byHand = 2 * Math.hypot(slope(74, 66, 1e-4) * 0.3, slope(66, 74, 1e-4) * 0.4)
  expect(colour.doubt).toBeCloseTo(byHand, 5)
})

test('two pages of one colour differ by nothing, with a doubt of the size of their channels’', () => {
  const page = { L: 72, a: -1, b: 1 }
  const u = { L: 0.3, a: 0.1, b: 0.1 }
  const { colour, lightness } = differencesOf(edition, device('one', page, u), device('other', page, u))
  expect(colour.deltaE00).toBe(0)
  expect(colour.doubt).toBeGreaterThan(0.3)
  expect(colour.doubt).toBeLessThan(1.5)
  expect(lightness).toMatchObject({ by: 0, close: true, small: false })
})

test('a difference is the same seen from the other side, with the other sign', () => {
  const one = device('one', { L: 72, a: -1, b: 1 }, { L: 0.3, a: 0.1, b: 0.1 }, { s1: 0.5, s2: 0.5 })
  const other = device('other', { L: 68, a: -2, b: 4 }, { L: 0.2, a: 0.2, b: 0.1 })
  const there = differencesOf(edition, one, other)
  const back = differencesOf(edition, other, one)
  expect(back.colour.deltaE00).toBeCloseTo(there.colour.deltaE00, 9)
  expect(back.colour.doubt).toBeCloseTo(there.colour.doubt, 6)
  for (const name of ['lightness', 'whiteness', 'tint', 'contrast'] as const) {
    expect(back[name].by).toBeCloseTo(-there[name].by, 12)
    expect(back[name].doubt).toBeCloseTo(there[name].doubt, 6)
  }
})

test('a sure step of whiteness or tint that is commonly too small to be seen is marked so', () => {
  const u = { L: 0.01, a: 0.01, b: 0.01 }
  const { whiteness, tint, lightness } = differencesOf(
    exact,
    device('one', { L: 72, a: -1, b: 1 }, u),
    device('other', { L: 71.4, a: -1, b: 1 }, u),
  )
  expect(whiteness).toMatchObject({ close: false, small: true })
  expect(lightness).toMatchObject({ close: false, small: false })
  expect(Math.abs(tint.by)).toBeLessThan(0.5)
})
