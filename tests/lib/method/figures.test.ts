import { describe, expect, test } from 'vitest'
import { labToXyz } from '@/lib/colour/lab'
import { cieWhiteness } from '@/lib/colour/whiteness'
import { xyzToXyy } from '@/lib/colour/xyy'
import {
  besidePaper,
  besidePaperUncertainty,
  derivedFigures,
  derivedUncertainty,
  deviceFigures,
  expandedFigure,
  pooledComponents,
  type SetReadings,
} from '@/lib/method/figures'
import { fillNormals } from '@/lib/method/random'
import type { Lab } from '@/lib/method/types'

const grey = (L: number): Lab => ({ L, a: 0, b: 0 })

function set(
  state: 'page' | 'ink',
  unit: string,
  lightnesses: number[],
  session = 's1',
  position = 'centre',
): SetReadings {
  return { session, unit, position, state, readings: lightnesses.map(grey) }
}

const components = {
  page: { reading: grey(0.3), position: grey(0.4), unit: grey(0.6) },
  ink: { reading: grey(0.2), position: grey(0.1), unit: grey(0.5) },
}

describe('a device’s figures from its readings', () => {
  const sets = [
    set('page', 'unit-1', [70, 72], 's1', 'centre'),
    set('page', 'unit-1', [74, 74, 74], 's2', 'corner'),
    set('page', 'unit-2', [66], 's2'),
    set('ink', 'unit-1', [20, 22]),
  ]

  // By hand: unit 1 is the mean of 71 and 74, 72.5; unit 2 is 66; the device 69.25 (all readings alike would give 71.67).
  test('a unit is the mean of its set means, a device the mean of its units', () => {
    const figures = deviceFigures(sets, components)
    expect(figures.page.L).toBeCloseTo(69.25, 12)
    expect(figures.ink.L).toBeCloseTo(21, 12)
  })

  // u² = s_unit²/k + s_pos²/m + s_r²/N: page k 2, m 3, N 6; ink k 1, m 1, N 2.
  test('the uncertainty counts units, sets and readings', () => {
    const { page, ink } = deviceFigures(sets, components)
    expect(page.u.L).toBeCloseTo(Math.sqrt(0.36 / 2 + 0.16 / 3 + 0.09 / 6), 12)
    expect(ink.u.L).toBeCloseTo(Math.sqrt(0.25 + 0.01 + 0.04 / 2), 12)
    expect(page.u.a).toBe(0)
  })

  test('a figure whose ink, or page, was measured on one unit is provisional', () => {
    expect(deviceFigures(sets, components)).toMatchObject({ units: 1, provisional: true })
    const both = deviceFigures([...sets, set('ink', 'unit-2', [21])], components)
    expect(both).toMatchObject({ units: 2, provisional: false })
  })

  test('sessions have the share of all sets of the device', () => {
    expect(deviceFigures(sets, components).sessions).toEqual({ s1: 0.5, s2: 0.5 })
  })

  test.each([
    { name: 'no page', sets: [set('ink', 'u', [20])] },
    { name: 'no ink', sets: [set('page', 'u', [70])] },
    { name: 'a set without readings', sets: [set('page', 'u', []), set('ink', 'u', [20])] },
    { name: 'a page under L* 20', sets: [set('page', 'u', [19.9]), set('ink', 'u', [10])] },
    { name: 'a page over L* 100', sets: [set('page', 'u', [100.1]), set('ink', 'u', [10])] },
    { name: 'an ink under L* 0', sets: [set('page', 'u', [70]), set('ink', 'u', [-0.1])] },
    { name: 'a reading that is not a number', sets: [set('page', 'u', [70, Number.NaN]), set('ink', 'u', [20])] },
  ])('$name is refused', ({ sets }) => {
    expect(() => deviceFigures(sets, components)).toThrow(RangeError)
  })
})

describe('components pooled over an edition', () => {
  /** A model of two units, two sets each, two readings a set: deviations ±r in sets, ±p between sets, ±v between units. */
  const model = (slug: string, centre: number, [r, p, v]: [number, number, number]) => ({
    slug,
    sets: [-1, 1].flatMap((unit) =>
      [-1, 1].flatMap((position) =>
        (['page', 'ink'] as const).map((state) =>
          set(
            state,
            `${slug}-${unit}`,
            [-1, 1].map((reading) => centre + unit * v + position * p + reading * r),
            's1',
            String(position),
          ),
        ),
      ),
    ),
  })

  // Balanced analysis of variance by hand, each deviation ±: mean squares within sets 2r², between sets 4p², between
  // units 8v²; so s_r² = 2r², s_pos² = (4p² − 2r²)/2, s_unit² = (8v² − 4p²)/4.
  test('with three models of two units the spread between units is the one found', () => {
    const found = pooledComponents(['a', 'b', 'c'].map((slug, i) => model(slug, 60 + 5 * i, [0.1, 0.2, 0.3])))
    for (const { reading, position, unit } of [found.page, found.ink]) {
      expect(reading.L).toBeCloseTo(Math.sqrt(0.02), 9)
      expect(position.L).toBeCloseTo(Math.sqrt((0.16 - 0.02) / 2), 9)
      expect(unit.L).toBeCloseTo(Math.sqrt((0.72 - 0.16) / 4), 9)
      expect(unit.a).toBe(0)
    }
  })

  // House floors of Method 1, section 1.
  test('with fewer it is at least 0.5, 0.3 and 0.4', () => {
    const { page, ink } = pooledComponents([model('a', 60, [0.1, 0.2, 0.3]), model('b', 70, [0.1, 0.2, 0.3])])
    expect(page.unit).toEqual({ L: 0.5, a: 0.3, b: 0.4 })
    expect(ink.unit).toEqual({ L: 0.5, a: 0.3, b: 0.4 })
    const wide = pooledComponents([model('a', 60, [0.1, 0.2, 2])])
    expect(wide.page.unit.L).toBeCloseTo(Math.sqrt((32 - 0.16) / 4), 9)
    expect(wide.page.unit.b).toBe(0.4)
  })

  test('what was never repeated counts as 0, but for the floor', () => {
    const { page } = pooledComponents([{ slug: 'a', sets: [set('page', 'u', [70]), set('ink', 'u', [20])] }])
    expect(page).toEqual({ reading: grey(0), position: grey(0), unit: { L: 0.5, a: 0.3, b: 0.4 } })
  })
})

describe('expanded uncertainty', () => {
  // Method 1, section 1: U = 2·√(u² + s_session²·Σ share² + u_common²).
  test('of a figure', () => {
    expect(expandedFigure(0.3, 0.2, { s1: 0.5, s2: 0.5 }, 0.1)).toBeCloseTo(2 * Math.sqrt(0.09 + 0.02 + 0.01), 12)
    expect(expandedFigure(0, 0.2, { s1: 1 }, 0)).toBeCloseTo(0.4, 12)
  })
})

describe('figures that follow from a page and its ink', () => {
  // Y(80) = 100·(96/116)³ = 56.6813, Y(20) = 100·(36/116)³ = 2.98904; C* = √(3² + 4²), h = 180° − 53.13°.
  test('luminance factors, contrast, chroma and hue, worked by hand', () => {
    const figures = derivedFigures({ L: 80, a: -3, b: 4 }, grey(20))
    expect(figures.yPage).toBeCloseTo(56.6813, 4)
    expect(figures.yInk).toBeCloseTo(2.98905, 4)
    expect(figures.contrast).toBeCloseTo((96 / 36) ** 3, 9)
    expect(figures.chroma).toBeCloseTo(5, 12)
    expect(figures.hue).toBeCloseTo(126.8699, 4)
  })

  test('no page of electronic paper is within the limits of the whiteness formula, and a neutral has no hue', () => {
    const figures = derivedFigures(grey(76), grey(20))
    expect(figures.withinLimits).toBe(false)
    expect(figures.hue).toBeNull()
    expect(figures.whiteness).toBeCloseTo(figures.yPage, 1)
  })

  test.each([
    { name: 'a page under L* 20', page: 19.99, ink: 10 },
    { name: 'a page over 100', page: 100.01, ink: 10 },
    { name: 'a page that is not a number', page: Number.NaN, ink: 10 },
    { name: 'an ink under 0', page: 70, ink: -0.01 },
    { name: 'an ink that sends nothing back', page: 70, ink: 0 },
  ])('$name is refused', ({ page, ink }) => {
    expect(() => derivedFigures(grey(page), grey(ink))).toThrow(RangeError)
  })

  // Y(93)/Y(70) = (109/86)³. ΔE00 of two greys is the difference of L* over S_L at their mean (ISO/CIE 11664-6).
  test('beside the control paper', () => {
    const beside = besidePaper(grey(70), grey(93))
    expect(beside.timesTheLight).toBeCloseTo((109 / 86) ** 3, 12)
    const m = (81.5 - 50) ** 2
    expect(beside.deltaE00).toBeCloseTo(23 / (1 + (0.015 * m) / Math.sqrt(20 + m)), 9)
  })
})

describe('doubt of what follows', () => {
  const uncertainty = { common: { L: 0.3, a: 0.1, b: 0.2 }, session: { L: 0.2, a: 0.05, b: 0.1 } }
  const device = {
    page: { L: 71, a: -2, b: 3, u: { L: 0.5, a: 0.2, b: 0.25 } },
    ink: { L: 22, a: 0.5, b: -1, u: { L: 0.6, a: 0.2, b: 0.2 } },
    sessions: { s1: 0.5, s2: 0.5 },
  }
  const shared = {
    L: Math.hypot(0.3, 0.2 * Math.SQRT1_2),
    a: Math.hypot(0.1, 0.05 * Math.SQRT1_2),
    b: Math.hypot(0.2, 0.1 * Math.SQRT1_2),
  }
  const doubts = derivedUncertainty(device, uncertainty)

  // JCGM 100, 5.1.2, with the slopes worked by hand: dY/dL = 300·((L + 16)/116)²/116.
  test('of luminance factor, contrast and chroma agrees with the slopes worked by hand', () => {
    const y = (L: number) => 100 * ((L + 16) / 116) ** 3
    const slope = (L: number) => (300 * ((L + 16) / 116) ** 2) / 116
    expect(doubts.yPage).toBeCloseTo(2 * slope(71) * Math.hypot(0.5, shared.L), 5)
    expect(doubts.yInk).toBeCloseTo(2 * slope(22) * Math.hypot(0.6, shared.L), 5)
    const [page, ink] = [slope(71) / y(71), slope(22) / y(22)]
    expect(doubts.contrast).toBeCloseTo(
      2 * (y(71) / y(22)) * Math.hypot(page * 0.5, ink * 0.6, (page - ink) * shared.L),
      4,
    )
    const [ua, ub] = [Math.hypot(0.2, shared.a), Math.hypot(0.25, shared.b)]
    expect(doubts.chroma).toBeCloseTo((2 * Math.hypot(2 * ua, 3 * ub)) / Math.hypot(2, 3), 6)
    expect(doubts.hue).toBeCloseTo((2 * Math.hypot(3 * ua, 2 * ub) * (180 / Math.PI)) / 13, 5)
  })

  // Second route: simulation (JCGM 101). 200,000 draws know a standard deviation to 0.16 %.
  test('of whiteness and tint agrees with simulation', () => {
    const draws = 200_000
    const z = fillNormals('simulated doubt', new Float64Array(3 * draws))
    const at = Array.from({ length: draws }, (_, k) =>
      cieWhiteness(
        xyzToXyy(
          labToXyz({
            L: 71 + Math.hypot(0.5, shared.L) * z[3 * k]!,
            a: -2 + Math.hypot(0.2, shared.a) * z[3 * k + 1]!,
            b: 3 + Math.hypot(0.25, shared.b) * z[3 * k + 2]!,
          }),
        ),
      ),
    )
    for (const name of ['whiteness', 'tint'] as const) {
      const mean = at.reduce((sum, one) => sum + one[name], 0) / draws
      const sd = Math.sqrt(at.reduce((sum, one) => sum + (one[name] - mean) ** 2, 0) / (draws - 1))
      expect(Math.abs(doubts[name] / (2 * sd) - 1)).toBeLessThan(0.01)
    }
  })

  test('a shared error that page and ink feel alike leaves their ratio less in doubt than two of its size', () => {
    const alone = derivedUncertainty(device, { common: grey(0), session: grey(0) }).contrast
    const apart = derivedUncertainty(
      {
        ...device,
        page: { ...device.page, u: { ...device.page.u, L: Math.hypot(0.5, 0.3) } },
        ink: { ...device.ink, u: { ...device.ink.u, L: Math.hypot(0.6, 0.3) } },
      },
      { common: grey(0), session: grey(0) },
    ).contrast
    const together = derivedUncertainty(device, { common: grey(0.3), session: grey(0) }).contrast
    expect(together).toBeGreaterThan(alone)
    expect(together).toBeLessThan(apart)
  })

  test('of a neutral: the chroma has the larger doubt of a* and b*, and there is no hue to doubt', () => {
    const neutral = derivedUncertainty({ ...device, page: { ...device.page, a: 0, b: 0 } }, uncertainty)
    expect(neutral.chroma).toBeCloseTo(2 * Math.hypot(0.25, shared.b), 9)
    expect(neutral.hue).toBeNull()
  })

  test('is finite at the ends of every scale', () => {
    for (const L of [20, 100]) {
      for (const ink of [0.01, 100]) {
        const at = { ...device, page: { ...device.page, L }, ink: { ...device.ink, L: ink } }
        for (const doubt of Object.values(derivedUncertainty(at, uncertainty)))
          expect(Number.isFinite(doubt)).toBe(true)
      }
    }
  })

  // Slope of Y_paper/Y_page by the page's L*: −(Y_paper/Y_page)·3/(L + 16); the common error moves the paper too.
  test('beside the control paper, the common error nearly drops out', () => {
    const paper = grey(93)
    const times = (109 / 87) ** 3
    const expected = 2 * times * Math.hypot((3 / 87) * 0.5, (3 / 87) * 0.2 * Math.SQRT1_2, (3 / 109 - 3 / 87) * 0.3)
    expect(besidePaperUncertainty(device, uncertainty, paper).timesTheLight).toBeCloseTo(expected, 6)
  })
})
