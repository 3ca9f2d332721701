import { expect, test } from 'vitest'
import { mean, sd } from '@/lib/stats/describe'
import { halfWidth } from '@/lib/stats/half-width'
import { tQuantile } from '@/lib/stats/student-t'
import gum from '@/tests/reference/gum.json'

// The cases differ in shape; each test reads the fields its own kind carries.
// biome-ignore lint/suspicious/noExplicitAny: a reference file of many shapes
const cases: any[] = gum.cases
const find = (id: string) => cases.find((entry) => entry.id === id)!

// JCGM 100:2008, 4.4.3, from memory (gum.json): u = s/√n on 19 degrees of freedom.
test('the half-width while measuring is Student’s t times the standard uncertainty of the mean', () => {
  const { input, expected, tolerance } = find('gum-4.4.3-thermometer')
  const u = halfWidth(input.data)! / tQuantile(0.975, expected.df)
  expect(Math.abs(u - expected.u)).toBeLessThanOrEqual(tolerance.u)
  expect(u).toBeCloseTo(expected.u, 9)
  // JCGM 100:2008, Table G.2: t95(19) = 2.09; here to the digits of the product 2.093024 × 0.332916.
  expect(halfWidth(input.data)).toBeCloseTo(0.6968, 4)
  expect(halfWidth(input.data, 0.99)).toBeGreaterThan(halfWidth(input.data)!)
})

// By Table G.2: t95 is 4.30, 2.78 and 2.26 for 2, 4 and 9 degrees of freedom; times 0.15/√n.
test.each([
  { n: 3, width: '0.37' },
  { n: 5, width: '0.19' },
  { n: 10, width: '0.11' },
])('$n readings with a spread of 0.15 leave a doubt of ± $width', ({ n, width }) => {
  const pattern = Array.from({ length: n }, (_, i) => i)
  const scale = 0.15 / sd(pattern)!
  expect(halfWidth(pattern.map((i) => 70 + i * scale))!.toFixed(2)).toBe(width)
})

test('there is no half-width below two readings, and equal readings have none beyond zero', () => {
  expect(halfWidth([])).toBeNull()
  expect(halfWidth([70])).toBeNull()
  expect(halfWidth([70, 70, 70])).toBe(0)
})

// JCGM 100:2008, H.2, Tables H.2 and H.3, read (gum.json): means and type A uncertainties of the three inputs.
test('means and uncertainties of the impedance readings are those of the Guide', () => {
  const { input, expected } = find('gum-h2-correlated')
  const columns: number[][] = [input.V, input.I_mA.map((mA: number) => mA / 1000), input.phi_rad]
  columns.forEach((readings, i) => {
    expect(mean(readings) / expected.means[i]).toBeCloseTo(1, 9)
    expect(halfWidth(readings)! / tQuantile(0.975, 4) / expected.u[i]).toBeCloseTo(1, 7)
  })
})
