import { describe, expect, test } from 'vitest'
import { CAT16_MATRIX, cat16 } from '@/lib/colour/adaptation'
import { labToLch, xyzToLab } from '@/lib/colour/lab'
import { spectrumToXyz, WAVELENGTHS_NM } from '@/lib/colour/spectrum'
import { type Light, WEIGHTS } from '@/lib/colour/weights'
import type { Xyz } from '@/lib/colour/white'
import { cieWhiteness, e313Yellowness, WHITENESS_D65_10 } from '@/lib/colour/whiteness'
import { xyzToXyy } from '@/lib/colour/xyy'
import cam16 from '../../reference/cam16.json'
import cie from '../../reference/cie-d65-10deg.json'
import reference from '../../reference/spectra.json'

const D65 = WEIGHTS.D65.white
// The file's method block: whiteness against the white to five digits.
const FORMULA = { ...WHITENESS_D65_10, xn: 0.31382, yn: 0.331 }

function expectXyz(got: Xyz, [X, Y, Z]: number[], digits: number) {
  expect(got.X).toBeCloseTo(X!, digits)
  expect(got.Y).toBeCloseTo(Y!, digits)
  expect(got.Z).toBeCloseTo(Z!, digits)
}

function expectColour(xyz: Xyz, { Lab, W, T }: { Lab: number[]; W: number; T: number }) {
  const lab = xyzToLab(xyz, D65)
  expect(lab.L).toBeCloseTo(Lab[0]!, 5)
  expect(lab.a).toBeCloseTo(Lab[1]!, 4)
  expect(lab.b).toBeCloseTo(Lab[2]!, 4)
  const { whiteness, tint } = cieWhiteness(xyzToXyy(xyz), FORMULA)
  expect(whiteness).toBeCloseTo(W, 3)
  expect(tint).toBeCloseTo(T, 4)
}

// tests/reference/spectra.json: ASTM E2022 weights with held ends, three routes; 2e-6 from six-decimal weights.
describe.each(reference.spectra)('$id, $name', ({ R, D65_10deg, otherLights }) => {
  test('under daylight its XYZ, colour, whiteness, tint and yellowness are the reference’s', () => {
    const xyz = spectrumToXyz(R)
    expectXyz(xyz, D65_10deg.XYZ, 5)
    expectColour(xyz, D65_10deg)
    const { x, y } = xyzToXyy(xyz)
    expect(x).toBeCloseTo(D65_10deg.xy[0]!, 7)
    expect(y).toBeCloseTo(D65_10deg.xy[1]!, 7)
    expect(cieWhiteness({ x, y, Y: xyz.Y }, FORMULA).withinLimits).toBe(D65_10deg.insideLimits)
    expect(e313Yellowness(xyz)).toBeCloseTo(D65_10deg.yellownessE313, 4)
    const { C, h } = labToLch(xyzToLab(xyz, D65))
    expect(C).toBeCloseTo(D65_10deg.LCh[1]!, 4)
    if (D65_10deg.LCh[2] === null) expect(h).toBeNull()
    else expect(Math.abs(h! - D65_10deg.LCh[2]!)).toBeLessThan(1e-3)
  })

  test.each(Object.entries(otherLights))(
    'under %s it is adapted back to daylight as in the reference',
    (name, light) => {
      const weights = WEIGHTS[name as Light]
      const xyz = spectrumToXyz(R, weights)
      expectXyz(xyz, light.XYZ, 5)
      const adapted = cat16(xyz, weights.white, D65)
      expectXyz(adapted, light.XYZadaptedToD65, 5)
      expectColour(adapted, light)
    },
  )
})

// D50 is not among that file's weights; lights.test.ts holds it to the tables they were worked out from.
describe.each(Object.entries(WEIGHTS).filter(([name]) => name !== 'D50'))('the weights of %s', (name, weights) => {
  test('are those of 360–780 nm with the ends folded in', () => {
    const table = cie.weights.tables[`${name}/10deg/10nm` as keyof typeof cie.weights.tables]
    const fold = (full: number[]) =>
      WAVELENGTHS_NM.map((wavelength) =>
        full.reduce((sum, weight, index) => {
          const nearest = Math.min(700, Math.max(400, table.wavelengths[index]!))
          return nearest === wavelength ? sum + weight : sum
        }, 0),
      )
    for (const [ours, theirs] of [
      [weights.X, fold(table.Wx)],
      [weights.Y, fold(table.Wy)],
      [weights.Z, fold(table.Wz)],
    ] as const) {
      for (const [index, weight] of ours.entries()) expect(Math.abs(weight - theirs[index]!)).toBeLessThan(5e-6)
    }
  })

  test('sum to the white of the light, Y 100', () => {
    const white = reference.whites[name as keyof typeof reference.whites]
    expectXyz(weights.white, white, 5)
  })
})

test('the adaptation is CAT16', () => {
  expect(CAT16_MATRIX).toEqual(cam16.model.matrix)
  expect(CAT16_MATRIX).toEqual(reference.CAT16.matrix)
})

test('the white of a light becomes the white adapted to, exactly as a neutral becomes a neutral', () => {
  for (const { white } of Object.values(WEIGHTS)) {
    const { X, Y, Z } = cat16({ X: 0.42 * white.X, Y: 0.42 * white.Y, Z: 0.42 * white.Z }, white, D65)
    expectXyz({ X, Y, Z }, [0.42 * D65.X, 0.42 * D65.Y, 0.42 * D65.Z], 10)
  }
})

test('a colour adapted to another light and back is itself', () => {
  const { white } = WEIGHTS.A
  const back = cat16(cat16({ X: 38, Y: 40, Z: 42 }, D65, white), white, D65)
  expectXyz(back, [38, 40, 42], 10)
})

test('a spectrum of the wrong length or scale is refused', () => {
  expect(() => spectrumToXyz(Array(30).fill(0.5))).toThrow(/31 values/)
  expect(() => spectrumToXyz([])).toThrow(RangeError)
  expect(() => spectrumToXyz(Array(31).fill(42))).toThrow('Reflectance at 400 nm must be from 0 to 1, got 42')
  expect(() => spectrumToXyz(Array(31).fill(-0.01))).toThrow(RangeError)
  expect(() => spectrumToXyz([...Array(30).fill(0.5), Number.NaN])).toThrow(/700 nm/)
  expect(spectrumToXyz(Array(31).fill(0))).toEqual({ X: 0, Y: 0, Z: 0 })
})

test('an adaptation from or to darkness is refused', () => {
  const black = { X: 0, Y: 0, Z: 0 }
  expect(() => cat16(D65, black, D65)).toThrow(RangeError)
  expect(() => cat16(D65, D65, black)).toThrow(RangeError)
  expect(() => cat16({ X: Number.NaN, Y: 1, Z: 1 }, D65, D65)).toThrow(RangeError)
})
