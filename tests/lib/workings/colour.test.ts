import { describe, expect, test } from 'vitest'
import { xyzToLab } from '@/lib/colour/lab'
import { colourFigures, colourSteps } from '@/lib/workings/colour'
import cielab from '@/tests/reference/cielab.json'
import whiteness from '@/tests/reference/whiteness.json'

const INK = { L: 22, a: -0.3, b: -0.8 }

// tests/reference/whiteness.json: CIE 15 whiteness and tint, with the white's chromaticity to four digits (ASTM E313).
const asPages = whiteness.vectors
  .filter(({ observer }) => observer === '10deg')
  .map((vector) => ({ ...vector, page: xyzToLab({ X: vector.X, Y: vector.Y, Z: vector.Z }) }))
  .filter(({ page }) => page.L >= 20 && page.L <= 100)

describe('a page’s whiteness and tint in the worked example are the reference’s', () => {
  test('there are pages among the vectors', () => {
    expect(asPages.length).toBeGreaterThan(10)
  })
  test.each(asPages)('$id, $name', (vector) => {
    const figures = colourFigures(vector.page, INK)
    expect(figures.whiteness).toBeCloseTo(vector['W_with_xn0.3138_yn0.3310']!, 4)
    expect(figures.tint).toBeCloseTo(vector['T_with_xn0.3138_yn0.3310']!, 4)
    expect([figures.X, figures.Y, figures.Z].map((value) => value.toFixed(4))).toEqual(
      [vector.X, vector.Y, vector.Z].map((value) => value.toFixed(4)),
    )
  })
})

// tests/reference/cielab.json: ISO/CIE 11664-4, four routes.
const tenDegree = cielab.vectors.filter(({ white, Lab }) => white === 'D65/10deg' && Lab[0]! >= 20 && Lab[0]! <= 100)
test.each(tenDegree)('XYZ, chroma and hue of $id are the reference’s', ({ Lab: [L, a, b], XYZ, LCh }) => {
  const { X, Y, Z, chroma, hue } = colourFigures({ L: L!, a: a!, b: b! }, INK)
  for (const [i, value] of [X, Y, Z].entries()) expect(value).toBeCloseTo(XYZ[i]!, 3)
  expect(chroma).toBeCloseTo(LCh[1]!, 4)
  if (LCh[2] !== null && LCh[1]! > 1e-6) expect(hue).toBeCloseTo(LCh[2]!, 2)
})

// Worked by hand from ISO/CIE 11664-4 and CIE 15 for L* 70, a* −1.5, b* 2:
// f = 86/116; Y = 100f³ = 40.7494; X = 94.811(f − 0.003)³ = 38.1678; Z = 107.304(f − 0.01)³ = 41.9801;
// x = 0.31570, y = 0.33706; W = Y + 800·(0.3138 − x) + 1700·(0.331 − y) = 28.93; T = 2.22.
test('each step shows the formula with the numbers put in and what comes out', () => {
  const steps = colourSteps({ L: 70, a: -1.5, b: 2 }, INK, null)
  const of = (id: string) => steps.find((step) => step.id === id)!
  const f = 86 / 116
  const Y = 100 * f ** 3
  const X = 94.811 * (f - 0.003) ** 3
  const Z = 107.304 * (f - 0.01) ** 3
  const [x, y] = [X / (X + Y + Z), Y / (X + Y + Z)]
  const W = Y + 800 * (0.3138 - x) + 1700 * (0.331 - y)
  const T = 900 * (0.3138 - x) - 650 * (0.331 - y)
  expect(of('xyz').worked).toContain(`Y = 100·((70.000 + 16)/116)³ = ${Y.toFixed(3)}`)
  expect(of('xyz').worked).toContain(`X = 94.811·((70.000 + 16)/116 + (−1.500)/500)³ = ${X.toFixed(3)}`)
  expect(of('xy').result).toContain(`x ${x.toFixed(5)}, y ${y.toFixed(5)}`)
  expect(of('whiteness').worked).toContain(`${Y.toFixed(3)} + 800·(0.3138 − ${x.toFixed(5)})`)
  expect(of('whiteness').result).toBe(`W₁₀ ${W.toFixed(2)}†`)
  expect(of('tint').result).toBe(`T₁₀ ${T.toFixed(2)}†, greenish`)
  expect(of('limits').result).toContain('Outside the formula’s limits')
  expect(of('chroma').result).toContain('C*ab 2.50')
  expect(steps.every(({ source }) => source.length > 0)).toBe(true)
})

test('a dark ink goes through the straight branch, and the step says so', () => {
  const { worked } = colourSteps({ L: 70, a: 0, b: 0 }, { L: 5, a: 0, b: 0 }, null).find(({ id }) => id === 'contrast')!
  // ISO/CIE 11664-4: Y = 100·(108/841)·((5 + 16)/116 − 4/29).
  const Y = (100 * 108 * (21 / 116 - 4 / 29)) / 841
  expect(worked).toContain(`Y(ink) = 100·(108/841)·((5.000 + 16)/116 − 4/29) = ${Y.toFixed(3)}`)
})

test('a colour no surface can have is worked out and called what it is', () => {
  const steps = colourSteps({ L: 20, a: -60, b: 60 }, INK, null)
  expect(steps.find(({ id }) => id === 'xyz')?.note).toContain('no surface has such a colour')
  expect(steps.map(({ result }) => result).join(' ')).not.toMatch(/NaN|Infinity/)
})
