import { requireFinite } from './finite'
import type { Xyz } from './white'

type Row = readonly [number, number, number]
type Matrix = readonly [Row, Row, Row]

/** XYZ to the sharpened cone responses of CAT16. Source: Li et al. 2017, CIE 248:2022. */
export const CAT16_MATRIX: Matrix = [
  [0.401288, 0.650173, -0.051461],
  [-0.250268, 1.204414, 0.045854],
  [-0.002079, 0.048952, 0.953127],
]
const TO_XYZ = inverse(CAT16_MATRIX)

/**
 * The corresponding colour: what a surface seen under one light looks like under another to eyes fully used to each
 * (CAT16, one step of von Kries, D = 1). The first white goes to the second exactly; Y 100 of both is assumed.
 * @throws RangeError when a value is not finite, or a white excites no cone of some kind
 * @see Li et al., Color Research and Application 42(6), 2017; CIE 248:2022
 */
export function cat16(xyz: Xyz, fromWhite: Readonly<Xyz>, toWhite: Readonly<Xyz>): Xyz {
  requireFinite('X, Y, Z', xyz.X, xyz.Y, xyz.Z)
  const sample = times(CAT16_MATRIX, [xyz.X, xyz.Y, xyz.Z])
  const from = times(CAT16_MATRIX, [fromWhite.X, fromWhite.Y, fromWhite.Z])
  const to = times(CAT16_MATRIX, [toWhite.X, toWhite.Y, toWhite.Z])
  if (![...from, ...to].every((response) => response > 0)) throw new RangeError('A white must excite all three cones')
  const [X, Y, Z] = times(TO_XYZ, [
    (sample[0] * to[0]) / from[0],
    (sample[1] * to[1]) / from[1],
    (sample[2] * to[2]) / from[2],
  ])
  return { X, Y, Z }
}

function times(matrix: Matrix, [p, q, r]: Row): Row {
  const row = ([a, b, c]: Row) => a * p + b * q + c * r
  return [row(matrix[0]), row(matrix[1]), row(matrix[2])]
}

/** By cofactors; culori has no CAT16 and no matrix of ours is singular. */
function inverse([[a, b, c], [d, e, f], [g, h, i]]: Matrix): Matrix {
  const determinant = a * (e * i - f * h) - b * (d * i - f * g) + c * (d * h - e * g)
  const over = (p: number, q: number, r: number): Row => [p / determinant, q / determinant, r / determinant]
  return [
    over(e * i - f * h, c * h - b * i, b * f - c * e),
    over(f * g - d * i, a * i - c * g, c * d - a * f),
    over(d * h - e * g, b * g - a * h, a * e - b * d),
  ]
}
