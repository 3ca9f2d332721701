/** CIE tristimulus values of a surface, on the scale where the perfect diffuser has Y 100. */
export type Xyz = { X: number; Y: number; Z: number }

/** Chromaticity x, y (dimensionless) and luminous reflectance Y in percent of the perfect diffuser. */
export type Xyy = { x: number; y: number; Y: number }

/** The reference white of everything we publish: illuminant D65, CIE 1964 10° observer. Source: ASTM E308. */
export const D65_10: Readonly<Xyz> = { X: 94.811, Y: 100, Z: 107.304 }
