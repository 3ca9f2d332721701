import fc from 'fast-check'
import { expect, test } from 'vitest'
import { tQuantile } from '@/lib/stats/student-t'
import reference from '@/tests/reference/student-t.json'

const { tolerance } = reference
const cells = reference.rows.flatMap((row) =>
  (['90', '95', '99'] as const).map((coverage) => ({
    df: row.df === 'inf' ? Number.POSITIVE_INFINITY : Number(row.df),
    coverage: Number(coverage),
    ...row[coverage],
  })),
)

/** Upper quantile for a two-sided coverage in percent. */
const twoSided = (coverage: number, df: number) => tQuantile((1 + coverage / 100) / 2, df)

// student-t.json: computed to eight decimals elsewhere; JCGM 100:2008, Table G.2, from memory.
test.each(cells)(
  't for $coverage % and $df degrees of freedom is $computed',
  ({ coverage, df, computed, gumTableG2 }) => {
    const t = twoSided(coverage, df)
    expect(Math.abs(t - computed)).toBeLessThanOrEqual(tolerance)
    // The table prints two decimals, and three in its last row.
    expect(t.toFixed(df === Number.POSITIVE_INFINITY ? 3 : 2)).toBe(
      gumTableG2.toFixed(df === Number.POSITIVE_INFINITY ? 3 : 2),
    )
  },
)

test.each(reference.nonInteger)('t for $p % and $df degrees of freedom is $computed', ({ p, df, computed }) => {
  expect(Math.abs(twoSided(p, df) - computed)).toBeLessThanOrEqual(tolerance)
})

// Closed forms: one degree is the Cauchy distribution, two degrees p ↦ (2p − 1)√(2/(1 − (2p − 1)²)).
test('one and two degrees of freedom follow their closed forms, far into the tail', () => {
  for (const p of [0.6, 0.9, 0.975, 0.999, 0.999995]) {
    const a = 2 * p - 1
    expect(tQuantile(p, 1) / Math.tan(Math.PI * (p - 0.5))).toBeCloseTo(1, 7)
    expect(tQuantile(p, 2) / (a * Math.sqrt(2 / (1 - a * a)))).toBeCloseTo(1, 7)
  }
})

test('the quantile is odd about a half, and falls to the normal one without a jump', () => {
  fc.assert(
    fc.property(
      fc.double({ min: 0.51, max: 0.9999, noNaN: true }),
      fc.double({ min: 1, max: 1e7, noNaN: true }),
      (p, df) => {
        expect(tQuantile(1 - p, df)).toBeCloseTo(-tQuantile(p, df), 6)
        expect(tQuantile(p, df)).toBeGreaterThanOrEqual(tQuantile(p, Number.POSITIVE_INFINITY) - 1e-7)
      },
    ),
  )
  for (const p of [0.6, 0.9, 0.975, 0.9999]) {
    expect(Math.abs(tQuantile(p, 1e5 - 1) - tQuantile(p, 1e5))).toBeLessThanOrEqual(2 * tolerance)
  }
})

// Abramowitz & Stegun 26.7.5, from memory: t differs from the normal quantile by (z³ + z)/4df, here under 1e-7.
test('hundreds of millions of degrees of freedom are as good as infinitely many', () => {
  for (const p of [0.6, 0.95, 0.975, 0.995, 0.9999]) {
    expect(Math.abs(tQuantile(p, 5e8) - tQuantile(p, Number.POSITIVE_INFINITY))).toBeLessThanOrEqual(tolerance)
  }
})

test('a probability or a number of degrees that cannot be is refused', () => {
  for (const p of [0, 1, -0.1, Number.NaN]) expect(() => tQuantile(p, 5)).toThrow(RangeError)
  for (const df of [0, -1, Number.NaN]) expect(() => tQuantile(0.975, df)).toThrow(RangeError)
})
