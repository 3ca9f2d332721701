import { cat16 } from './adaptation'
import { type Lab, xyzToLab } from './lab'
import { spectrumToXyz } from './spectrum'
import type { LightWeights } from './weights'
import { D65_10, type Xyz } from './white'
import { xyzToXyy } from './xyy'

export type UnderLamp = {
  /** Tristimulus values in that lamp's light, Y 100 for the perfect diffuser. */
  xyz: Xyz
  /** Chromaticity of the light that comes back, dimensionless: the lamp's own colour is in it. */
  x: number
  y: number
  /** CIELAB against the lamp's own white. */
  lab: Lab
  /** The corresponding colour in daylight (CAT16, D = 1), CIELAB against D65/10°: what a display is given. */
  inDaylight: Lab
}

/**
 * A surface under a lamp, 10° observer, from its reflectance, to eyes wholly used to the lamp. A level spectrum is
 * neutral under every lamp. Reflectance only: the ultraviolet of a lamp and what a brightener makes of it stay out.
 * @param reflectance 31 radiance factors, 400–700 nm step 10 nm, 1 = perfect diffuser
 * @throws RangeError as `spectrumToXyz`
 * @see ASTM E308; ISO/CIE 11664-4; Li et al. 2017 (CAT16)
 */
export function underLamp(reflectance: readonly number[], lamp: LightWeights): UnderLamp {
  const xyz = spectrumToXyz(reflectance, lamp)
  const { x, y } = xyzToXyy(xyz)
  return { xyz, x, y, lab: xyzToLab(xyz, lamp.white), inDaylight: xyzToLab(cat16(xyz, lamp.white, D65_10)) }
}
