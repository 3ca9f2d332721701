import { labToXyz } from '@/lib/colour/lab'
import { spectrumToXyz, WAVELENGTHS_NM } from '@/lib/colour/spectrum'
import type { Lab } from '@/lib/method/types'

/** Smooth shapes that a page's reflectance is mixed from: level, a rise towards blue, a rise towards red. */
const SHAPES = {
  mono: (nm: number) => 1 - 0.35 * Math.exp(-((nm - 385) / 22)),
  // The three transmission bands of a colour filter, seen as gentle bumps.
  filter: (nm: number) =>
    0.8 - 0.28 * Math.exp(-((nm - 385) / 22)) + 0.2 * (bump(nm, 455, 26) + bump(nm, 535, 30) + bump(nm, 625, 38)),
}

const LEVEL = () => 1
const TO_BLUE = (nm: number) => 1 / (1 + Math.exp((nm - 480) / 18))
const TO_RED = (nm: number) => 1 / (1 + Math.exp((590 - nm) / 20))

function bump(nm: number, centre: number, width: number) {
  return Math.exp(-(((nm - centre) / width) ** 2))
}

/**
 * A smooth spectrum (radiance factor, 400–700 nm every 10 nm) that has exactly this colour under D65 for the 10°
 * observer: XYZ is linear in the spectrum, so three shapes and three equations settle it.
 * @throws RangeError where the mix would leave 0–1, as for a colour no page has
 */
export function spectrumOf(colour: Lab, kind: keyof typeof SHAPES): number[] {
  const shapes = [LEVEL, TO_BLUE, TO_RED].map((tilt) => WAVELENGTHS_NM.map((nm) => SHAPES[kind](nm) * tilt(nm)))
  const columns = shapes.map((shape) => {
    const { X, Y, Z } = spectrumToXyz(shape)
    return [X, Y, Z]
  }) as [Vector, Vector, Vector]
  const { X, Y, Z } = labToXyz(colour)
  const [level, blue, red] = solve(columns, [X, Y, Z])
  const spectrum = WAVELENGTHS_NM.map((_, i) => level * shapes[0]![i]! + blue * shapes[1]![i]! + red * shapes[2]![i]!)
  if (spectrum.some((value) => !(value >= 0 && value <= 1))) {
    throw new RangeError(`No smooth spectrum between 0 and 1 has L* ${colour.L}, a* ${colour.a}, b* ${colour.b}`)
  }
  return spectrum
}

type Vector = [number, number, number]

/** Cramer's rule for three equations; columns are the unknowns' coefficients. */
function solve([p, q, r]: [Vector, Vector, Vector], target: Vector): Vector {
  const all = determinant(p, q, r)
  return [determinant(target, q, r) / all, determinant(p, target, r) / all, determinant(p, q, target) / all]
}

function determinant(p: Vector, q: Vector, r: Vector): number {
  return p[0] * (q[1] * r[2] - q[2] * r[1]) - q[0] * (p[1] * r[2] - p[2] * r[1]) + r[0] * (p[1] * q[2] - p[2] * q[1])
}
