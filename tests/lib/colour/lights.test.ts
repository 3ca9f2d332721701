import { describe, expect, test } from 'vitest'
import { spectrumToXyz, WAVELENGTHS_NM } from '@/lib/colour/spectrum'
import { type Light, WEIGHTS } from '@/lib/colour/weights'
import cie from '../../reference/cie-d65-10deg.json'
import reference from '../../reference/spectra.json'

// Everything here starts from the CIE tables at 5 nm in tests/reference/cie-d65-10deg.json: the CIE 1964 observer
// (ISO/CIE 11664-1) and the illuminants (CIE 15, ISO/CIE 11664-2), and shares nothing with the weights of the product.
const { observer10deg, illuminants } = cie
const CHANNELS = ['xbar', 'ybar', 'zbar'] as const

const spdOf = (name: string) => illuminants.table[name as keyof typeof illuminants.table].spd5nm_380_780

/** Linear between the values of a table; 0 outside it. */
function between(values: readonly number[], from: number, step: number, nm: number): number {
  const place = (nm - from) / step
  if (place < 0 || place > values.length - 1) return 0
  const i = Math.min(values.length - 2, Math.floor(place))
  return values[i]! + (place - i) * (values[i + 1]! - values[i]!)
}

/** The factor of the value at `j` in the Lagrange polynomial through `indexes`, at a place counted in steps. */
function lagrange(indexes: readonly number[], j: number, place: number): number {
  return indexes.reduce((product, k) => (k === j ? product : (product * (place - k)) / (j - k)), 1)
}

/** The observer at 1 nm by the polynomial through the six values around. */
function observer(channel: (typeof CHANNELS)[number], nm: number): number {
  const values = observer10deg[channel]
  const place = (nm - 360) / 5
  const first = Math.max(0, Math.min(values.length - 6, Math.floor(place) - 2))
  const around = Array.from({ length: 6 }, (_, i) => first + i)
  return around.reduce((sum, j) => sum + values[j]! * lagrange(around, j, place), 0)
}

/** Weights by ASTM E2022: products at 1 nm shared among the 10 nm values by cubic, at the ends quadratic, polynomials. */
function worked(name: string): number[][] {
  const spd = spdOf(name)
  const raw = CHANNELS.map((channel) => {
    const weights = Array<number>(43).fill(0)
    for (let nm = 360; nm <= 780; nm++) {
      const product = between(spd, 380, 5, nm) * observer(channel, nm)
      const interval = Math.min(41, Math.floor((nm - 360) / 10))
      const around = [interval - 1, interval, interval + 1, interval + 2].filter((i) => i >= 0 && i <= 42)
      for (const j of around) weights[j]! += product * lagrange(around, j, (nm - 360) / 10)
    }
    return weights
  })
  const k = 100 / raw[1]!.reduce((sum, weight) => sum + weight)
  return raw.map((weights) => folded(weights.map((weight) => k * weight)))
}

/** Those of 360–390 nm added to 400 nm, those of 710–780 nm to 700 nm. */
function folded(weights: readonly number[]): number[] {
  const ends = Array<number>(31).fill(0)
  weights.forEach((weight, i) => {
    ends[Math.min(30, Math.max(0, i - 4))]! += weight
  })
  return ends
}

describe.each(Object.keys(WEIGHTS) as Light[])('the weights of %s', (name) => {
  // The observer at 1 nm is interpolated here, which leaves a few thousandths where it bends most.
  test('are those the CIE tables give by ASTM E2022', () => {
    const { X, Y, Z } = WEIGHTS[name]
    const theirs = worked(name)
    for (const [channel, ours] of [X, Y, Z].entries()) {
      expect(ours).toHaveLength(WAVELENGTHS_NM.length)
      for (const [i, weight] of ours.entries()) {
        expect(Math.abs(weight - theirs[channel]![i]!), `${WAVELENGTHS_NM[i]} nm`).toBeLessThan(0.004)
      }
    }
  })

  // White by a 1 nm sum of the same CIE tables, another route than the weights; and x, y as CIE 15 prints them.
  test('sum to the light’s own white', () => {
    const { white10deg } = illuminants.table[name]
    const { X, Y, Z } = WEIGHTS[name].white
    for (const [i, value] of [X, Y, Z].entries()) expect(value).toBeCloseTo(white10deg.XYZsum1nm[i]!, 4)
    if ('xyPublished' in white10deg && white10deg.xyPublished) {
      expect(X / (X + Y + Z)).toBeCloseTo(white10deg.xyPublished[0]!, 4)
      expect(Y / (X + Y + Z)).toBeCloseTo(white10deg.xyPublished[1]!, 4)
    }
  })
})

// The spectra of tests/reference/spectra.json have no D50; a plain sum at 5 nm stands in, the reflectance linear between
// its values and level beyond them. Where the spectrum bends sharply that sum is itself off by up to 0.2.
test.each(reference.spectra)(
  '$name under D50 has the colour a sum at 5 nm gives',
  ({ R, simpleSumsForComparison, D65_10deg }) => {
    const spd = spdOf('D50')
    const at = (nm: number) => between(R, 400, 10, Math.min(700, Math.max(400, nm)))
    const sum = (channel: (typeof CHANNELS)[number], reflectance: (nm: number) => number) =>
      spd.reduce((total, power, i) => total + power * observer10deg[channel][i + 4]! * reflectance(380 + 5 * i), 0)
    const white = sum('ybar', () => 1)
    const own = Math.max(
      ...simpleSumsForComparison.sum5nm_380_780_linearR_heldEnds.map((value, i) => Math.abs(value - D65_10deg.XYZ[i]!)),
    )
    const { X, Y, Z } = spectrumToXyz(R, WEIGHTS.D50)
    for (const [i, value] of [X, Y, Z].entries()) {
      expect(Math.abs(value - (100 * sum(CHANNELS[i]!, at)) / white)).toBeLessThan(0.03 + 1.5 * own)
    }
  },
)
