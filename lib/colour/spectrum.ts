import { type LightWeights, WEIGHTS } from './weights'
import type { Xyz } from './white'

/** Wavelengths of the reflectances, nm: 400 to 700 in steps of 10, 31 values. */
export const WAVELENGTHS_NM: readonly number[] = Array.from({ length: 31 }, (_, index) => 400 + 10 * index)

/** Above 1 only through fluorescence; beyond this a percentage was passed for a fraction (house). */
const HIGHEST_REFLECTANCE = 2

/**
 * Tristimulus values of a surface from its reflectance spectrum, 10° observer. The spectrum is taken to go on level
 * below 400 and above 700 nm: the weights of those ends are folded into the first and the last. No bandpass correction.
 * @param reflectance 31 radiance factors, 400–700 nm step 10 nm, 1 = perfect diffuser; a brightened paper may pass 1
 * @param weights the light; D65 unless told otherwise. To compare with `weights.white`, not with the rounded D65/10°
 * @returns XYZ under that light, Y 100 for the perfect diffuser; not adapted to any other
 * @throws RangeError when there are not 31 values, or one is not in 0–2
 * @see ASTM E308, ASTM E2022
 */
export function spectrumToXyz(reflectance: readonly number[], weights: LightWeights = WEIGHTS.D65): Xyz {
  if (reflectance.length !== WAVELENGTHS_NM.length) {
    throw new RangeError(`A spectrum has ${WAVELENGTHS_NM.length} values, 400–700 nm by 10, got ${reflectance.length}`)
  }
  const xyz = { X: 0, Y: 0, Z: 0 }
  for (const [index, value] of reflectance.entries()) {
    if (!(value >= 0 && value <= HIGHEST_REFLECTANCE)) {
      throw new RangeError(`Reflectance at ${WAVELENGTHS_NM[index]} nm must be from 0 to 1, got ${value}`)
    }
    xyz.X += value * (weights.X[index] ?? 0)
    xyz.Y += value * (weights.Y[index] ?? 0)
    xyz.Z += value * (weights.Z[index] ?? 0)
  }
  return xyz
}
