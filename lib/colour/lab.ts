import { convertLabToLch } from 'culori/fn'
import { requireFinite } from './finite'
import { D65_10, type Xyz } from './white'

/** CIELAB: lightness L* (0 black to 100 white), a* (− green, + red) and b* (− blue, + yellow). */
export type Lab = { L: number; a: number; b: number }

/** Lightness L*, chroma C*ab (≥ 0) and hue angle hab in degrees (0 ≤ h < 360); null for a neutral, which has no hue. */
export type Lch = { L: number; C: number; h: number | null }

/** Where CIELAB's cube root gives way to its straight line, t = Y/Yn; ISO/CIE 11664-4. */
const LINEAR_BELOW = (6 / 29) ** 3
const LINEAR_SLOPE = 841 / 108
const LINEAR_OFFSET = 4 / 29

const compress = (t: number) => (t > LINEAR_BELOW ? Math.cbrt(t) : LINEAR_SLOPE * t + LINEAR_OFFSET)
const expand = (f: number) => (f > 6 / 29 ? f ** 3 : (f - LINEAR_OFFSET) / LINEAR_SLOPE)

/**
 * CIELAB of a surface against a white of the same light and observer. The white is 100, 0, 0 and black 0, 0, 0.
 * Nothing is clipped: a fluorescent paper may pass L* 100.
 * @throws RangeError when a value is not finite: a broken reading reached us unchecked
 * @see ISO/CIE 11664-4
 */
export function xyzToLab({ X, Y, Z }: Xyz, white: Readonly<Xyz> = D65_10): Lab {
  requireFinite('X, Y, Z', X, Y, Z)
  const fx = compress(X / white.X)
  const fy = compress(Y / white.Y)
  const fz = compress(Z / white.Z)
  return { L: 116 * fy - 16, a: 500 * (fx - fy), b: 200 * (fy - fz) }
}

/**
 * The exact reverse of `xyzToLab`, straight branch included. A colour no surface can have (very dark, very strong)
 * comes back with a negative X or Z rather than altered, so that the round trip holds.
 * @throws RangeError when a value is not finite
 * @see ISO/CIE 11664-4
 */
export function labToXyz({ L, a, b }: Lab, white: Readonly<Xyz> = D65_10): Xyz {
  requireFinite('L*, a*, b*', L, a, b)
  const fy = (L + 16) / 116
  return { X: white.X * expand(fy + a / 500), Y: white.Y * expand(fy), Z: white.Z * expand(fy - b / 200) }
}

/**
 * Luminous reflectance Y in percent of the perfect diffuser, from lightness alone.
 * @param L lightness L*, 0 (Y 0) to 100 (Y 100)
 * @throws RangeError when L is not in 0–100
 */
export function lightnessToY(L: number): number {
  if (!(L >= 0 && L <= 100)) throw new RangeError(`L* must be from 0 to 100, got ${L}`)
  return 100 * expand((L + 16) / 116)
}

/** Chroma below which a colour counts as neutral: the rounding of the arithmetic, far under what a sphere reads (house). */
const NEUTRAL_CHROMA = 1e-9

/** Lightness, chroma and hue angle. The hue is null where the chroma is nil. */
export function labToLch({ L, a, b }: Lab): Lch {
  requireFinite('L*, a*, b*', L, a, b)
  const { c, h } = convertLabToLch({ l: L, a, b })
  // Just under 0° culori rounds up to 360°, and the a* axis itself may come as −0.
  return { L, C: c, h: h === undefined || c < NEUTRAL_CHROMA ? null : (h + 360) % 360 }
}
