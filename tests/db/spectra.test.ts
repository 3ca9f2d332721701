import { isNotNull } from 'drizzle-orm'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { readings } from '@/db/schema'
import { xyzToLab } from '@/lib/colour/lab'
import { spectrumToXyz } from '@/lib/colour/spectrum'
import { createSeededDatabase } from '@/tests/fixtures/db'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
let rows: {
  lStar: number
  aStar: number
  bStar: number
  instrumentWhiteness: number | null
  spectrum: number[] | null
}[]
beforeAll(async () => {
  seeded = await createSeededDatabase()
  const { lStar, aStar, bStar, instrumentWhiteness, spectrum } = readings
  rows = await seeded.db
    .select({ lStar, aStar, bStar, instrumentWhiteness, spectrum })
    .from(readings)
    .where(isNotNull(readings.spectrum))
})
afterAll(() => seeded.drop())

// ASTM E308 with the weights folded at 400 and 700 nm; CIELAB against 94.811, 100, 107.304. Recorded to two decimals.
test('every spectrum gives the L*a*b* recorded beside it', () => {
  expect(rows.length).toBeGreaterThan(400)
  for (const { lStar, aStar, bStar, spectrum } of rows) {
    const { L, a, b } = xyzToLab(spectrumToXyz(spectrum!))
    expect(Math.abs(L - lStar)).toBeLessThan(0.0051)
    expect(Math.abs(a - aStar)).toBeLessThan(0.0051)
    expect(Math.abs(b - bStar)).toBeLessThan(0.0051)
  }
})

test('every spectrum is smooth and lies between black and the perfect diffuser', () => {
  for (const { spectrum } of rows) {
    const values = spectrum!
    expect(Math.min(...values)).toBeGreaterThan(0)
    expect(Math.max(...values)).toBeLessThan(1)
    const level = values.reduce((sum, value) => sum + value, 0) / values.length
    // Bends: how far a value lies from the middle of its neighbours, against the level of the whole.
    const bends = values.slice(1, -1).map((value, i) => Math.abs(value - (values[i]! + values[i + 2]!) / 2) / level)
    expect(Math.max(...bends)).toBeLessThan(0.05)
  }
})

/** W10 of L*a*b* from the CIE formula, written out: shares nothing with the product. */
function whiteness(L: number, a: number, b: number): number {
  const cube = (t: number) => (t > 6 / 29 ? t ** 3 : (108 / 841) * (t - 4 / 29))
  const fy = (L + 16) / 116
  const [X, Y, Z] = [94.811 * cube(fy + a / 500), 100 * cube(fy), 107.304 * cube(fy - b / 200)]
  return Y + 800 * (0.3138 - X / (X + Y + Z)) + 1700 * (0.331 - Y / (X + Y + Z))
}

// Two decimals of L*a*b* leave W a range of about ±0.04 on a page (computed); an ink's chromaticity weighs more.
test('the instrument’s own whiteness is that of the L*a*b* it recorded', () => {
  for (const { lStar, aStar, bStar, instrumentWhiteness } of rows) {
    const range = lStar > 50 ? 0.045 : 0.12
    expect(Math.abs(whiteness(lStar, aStar, bStar) - instrumentWhiteness!)).toBeLessThan(range)
  }
})
