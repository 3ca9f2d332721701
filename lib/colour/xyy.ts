import { requireFinite } from './finite'
import { D65_10, type Xyy, type Xyz } from './white'

const WHITE_SUM = D65_10.X + D65_10.Y + D65_10.Z

/**
 * Chromaticity and luminous reflectance (percent) of a surface. Black has no chromaticity of its own; it is given that
 * of the D65/10° white, so that a grey stays grey all the way down.
 * @throws RangeError when a value is not finite, or when X + Y + Z is not positive and the sample is not black
 * @see CIE 15
 */
export function xyzToXyy({ X, Y, Z }: Xyz): Xyy {
  requireFinite('X, Y, Z', X, Y, Z)
  if (X === 0 && Y === 0 && Z === 0) return { x: D65_10.X / WHITE_SUM, y: D65_10.Y / WHITE_SUM, Y: 0 }
  const sum = X + Y + Z
  if (!(sum > 0)) throw new RangeError(`X + Y + Z must be positive, got ${sum}: no surface has such a colour`)
  return { x: X / sum, y: Y / sum, Y }
}

/**
 * Tristimulus values from chromaticity and luminous reflectance (percent). Y 0 is black whatever the chromaticity.
 * @throws RangeError when a value is not finite, or when y is not positive and Y is not 0
 * @see CIE 15
 */
export function xyyToXyz({ x, y, Y }: Xyy): Xyz {
  requireFinite('x, y, Y', x, y, Y)
  if (Y === 0) return { X: 0, Y: 0, Z: 0 }
  if (!(y > 0)) throw new RangeError(`y must be positive, got ${y}`)
  return { X: (x / y) * Y, Y, Z: ((1 - x - y) / y) * Y }
}
