import { convertXyz65ToRgb, formatHex } from 'culori/fn'
import { cat16 } from './adaptation'
import { type Lab, labToXyz } from './lab'
import { D65_10 } from './white'

/** sRGB's white: D65 for the 2° observer, from its chromaticity 0.3127, 0.3290. Source: IEC 61966-2-1. */
const SRGB_WHITE = { X: (100 * 0.3127) / 0.329, Y: 100, Z: (100 * (1 - 0.3127 - 0.329)) / 0.329 }

/**
 * A measured colour as a display's `#rrggbb`, for drawing a page beside its figures. Approximate: displays are not
 * calibrated, and 10° figures are shown through a 2° encoding. Adapted from the 10° white to sRGB's own, so a neutral
 * is a neutral grey and L* 100 is #ffffff; what sRGB cannot show is clipped per channel.
 * @throws RangeError when a value is not finite
 */
export function labToHex(lab: Lab): string {
  const { X, Y, Z } = cat16(labToXyz(lab), D65_10, SRGB_WHITE)
  return formatHex(convertXyz65ToRgb({ x: X / 100, y: Y / 100, z: Z / 100 }))
}
