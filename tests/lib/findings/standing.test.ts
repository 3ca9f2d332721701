import { describe, expect, test } from 'vitest'
import { differenceDoubt, type Measured, type Quantity } from '@/lib/findings/difference'
import { leaderBy, standingBy } from '@/lib/findings/standing'

const lightness: Quantity = ({ page }) => page.L
const chroma: Quantity = ({ page }) => Math.hypot(page.a, page.b)
const contrast: Quantity = ({ page, ink }) => page.L / ink.L

const NONE = { L: 0, a: 0, b: 0 }
const device = (
  slug: string,
  page: { L: number; a?: number; b?: number; u?: number },
  sessions = { s1: 1 } as Record<string, number>,
): Measured => {
  const u = page.u ?? 0
  return {
    slug,
    page: { L: page.L, a: page.a ?? 0, b: page.b ?? 0, u: { L: u, a: u, b: u } },
    ink: { L: 20, a: 0, b: 0, u: NONE },
    sessions,
  }
}
const doubts = (common: number, session: number) => ({
  uncertainty: { common: { L: common, a: common, b: common }, session: { L: session, a: session, b: session } },
})

// Worked by hand from JCGM 100:2008, 5.1.2 and 5.2.2 (inputs two figures share are correlated inputs of a difference).
describe('the doubt of a difference', () => {
  test('is twice the root sum of squares of the two devices’ own parts', () => {
    const one = device('one', { L: 70, u: 0.3 })
    const other = device('other', { L: 71, u: 0.4 })
    expect(differenceDoubt(doubts(0, 0), one, other, lightness)).toBeCloseTo(2 * 0.5, 6)
  })

  test('knows nothing of the common part, however large', () => {
    expect(differenceDoubt(doubts(5, 0), device('one', { L: 70 }), device('other', { L: 60 }), lightness)).toBeCloseTo(
      0,
      6,
    )
  })

  test('knows nothing of a session both share', () => {
    expect(differenceDoubt(doubts(0, 5), device('one', { L: 70 }), device('other', { L: 60 }), lightness)).toBeCloseTo(
      0,
      6,
    )
  })

  test('takes each session by the difference of the shares: 2·0.2·√(0.5² + 0.5²)', () => {
    const one = device('one', { L: 70 }, { s1: 1 })
    const other = device('other', { L: 60 }, { s1: 0.5, s2: 0.5 })
    expect(differenceDoubt(doubts(0, 0.2), one, other, lightness)).toBeCloseTo(2 * 0.2 * Math.SQRT1_2, 6)
  })

  // ∂C/∂a is 1 for the one and −1 for the other, so a common error of a* counts twice over: 2·2·0.1.
  test('keeps a common error that moves two chromas in opposite directions', () => {
    const one = device('one', { L: 70, a: 2 })
    const other = device('other', { L: 70, a: -3 })
    expect(differenceDoubt(doubts(0.1, 0), one, other, chroma)).toBeCloseTo(2 * 2 * 0.1, 6)
  })

  // f = L/20 each: the slope by the page is 1/20, by the common error (1/20 − L/400) on page and ink alike.
  test('moves page and ink together by what they share', () => {
    const [one, other] = [device('one', { L: 70 }), device('other', { L: 60 })]
    expect(differenceDoubt(doubts(0.1, 0), one, other, contrast)).toBeCloseTo(2 * 0.1 * (10 / 400), 5)
  })
})

describe('a device’s standing', () => {
  const edition = {
    ...doubts(0.5, 0),
    devices: [
      device('amber', { L: 75, u: 0.1 }),
      device('birch', { L: 74.8, u: 0.1 }),
      device('cedar', { L: 74.7, u: 0.1 }),
      device('dogwood', { L: 70, u: 0.1 }),
    ],
  }

  // U of a difference is 2·√(0.1² + 0.1²) = 0.283.
  test.each([
    ['amber', { place: 1, best: 1, worst: 2, of: 4 }],
    ['birch', { place: 2, best: 1, worst: 3, of: 4 }],
    ['cedar', { place: 3, best: 2, worst: 3, of: 4 }],
    ['dogwood', { place: 4, best: 4, worst: 4, of: 4 }],
  ])('of %s is a band where the doubt allows more than one place', (slug, standing) => {
    expect(standingBy(edition, edition.devices.find((d) => d.slug === slug)!, lightness)).toEqual(standing)
  })

  test('the leader is named with those too close to call', () => {
    const leader = leaderBy(edition, lightness)
    expect(leader?.first.slug).toBe('amber')
    expect(leader?.tied.map((d) => d.slug)).toEqual(['birch'])
  })

  test('an edition without devices has no leader', () => {
    expect(leaderBy({ ...edition, devices: [] }, lightness)).toBeNull()
  })
})
