/** Threshold contrast of a reading task after Rea & Ouellette; lengths in mm, luminance in cd/m², log to base 10. */
export const THRESHOLD_MODEL = {
  source:
    'M. S. Rea and M. J. Ouellette, Relative visual performance: a basis for application, Lighting Research & Technology 23(3), 1991',
  /** Pupil radius, mm: middle − swing·tanh(slope·log L). */
  pupil: { middle: 2.3859, swing: 1.2204, slope: 0.3 },
  /** The light lost in the lens: the share of it that is gone, a year over the base age. */
  lens: { baseAge: 20, lossPerYear: 0.017 },
  /** How much more contrast older eyes need: this share of the threshold more, over so many years past the base age. */
  ageing: { rise: 0.113, overYears: 45 },
  /** log Ct = constant + size·p1 + light·p2 + size2·p1² + light2·p2² + sizeLight·p1·p2. */
  log: {
    constant: -1.36415,
    size: -0.178589,
    light: -0.81285,
    size2: 0.225998,
    light2: -0.077169,
    sizeLight: 0.169252,
  },
  /** p1 = log tanh(perSteradian·ω), ω in steradians. */
  size: { perSteradian: 20_000 },
} as const

/** Where Method 1 uses the model. The authors' own range of luminance was not available to us, so these are house. */
export const MODEL_RANGE = {
  /** Below this luminance, cd/m², nothing is said to be readable. */
  lowestLuminance: 0.05,
  /** More light than this, cd/m², is counted as this. */
  highestLuminance: 2000,
  /** log(10·I/π) below this leaves the model; it binds only at age 65 below 0.0533 cd/m². */
  lowestLogRetinal: 0.001,
  /** Ages the model is written for, years (from memory). */
  lowestAge: 20,
  highestAge: 65,
} as const

/**
 * Contrast reserve at which reading is possible at all, fluent, and as good as it gets. Title and figures from memory; their
 * thresholds are for letters, this model's for targets of reading-task size, and carrying one to the other is house.
 */
export const READING_ANCHORS = {
  source:
    'S. G. Whittaker and J. Lovie-Kitchin, Visual requirements for reading, Optometry and Vision Science 70, 1993',
  spot: 3,
  fluent: 10,
  best: 30,
} as const

/** Luminance cd/m², observer's age in years, target size in microsteradians. */
type Sight = { luminance: number; age: number; size: number }

const { pupil, lens, ageing, log } = THRESHOLD_MODEL
const { lowestLuminance, highestLuminance, lowestLogRetinal, lowestAge, highestAge } = MODEL_RANGE
const SIZE_SCALE = THRESHOLD_MODEL.size.perSteradian * 1e-6

/** Pupil radius in mm at a luminance above 0 cd/m². */
export function pupilRadius(luminance: number): number {
  return pupil.middle - pupil.swing * Math.tanh(pupil.slope * Math.log10(luminance))
}

/** Retinal illuminance in trolands: what the pupil lets in and the ageing lens lets through. */
export function retinalIlluminance(luminance: number, age: number): number {
  return luminance * Math.PI * pupilRadius(luminance) ** 2 * (1 - lens.lossPerYear * (age - lens.baseAge))
}

/**
 * Logarithm of the threshold contrast, without the guards of `thresholdContrast`: for the draws, which call it by the
 * hundred thousand with numbers already checked.
 * @param luminance cd/m²; above 2,000 counts as 2,000
 * @param age 20–65 years
 * @param size microsteradians, above 0
 * @returns log10 Ct, or +∞ outside the model (below 0.05 cd/m², or too little light on the retina; NaN too)
 */
export function log10ThresholdContrast(luminance: number, age: number, size: number): number {
  if (!(luminance >= lowestLuminance)) return Infinity
  const logRetinal = Math.log10((10 * retinalIlluminance(Math.min(luminance, highestLuminance), age)) / Math.PI)
  // Before p2: the logarithm of nothing or of less would slip through every later comparison as NaN.
  if (!(logRetinal >= lowestLogRetinal)) return Infinity
  const p1 = Math.log10(Math.tanh(SIZE_SCALE * size))
  const p2 = Math.log10(logRetinal)
  return (
    Math.log10(1 + (ageing.rise / ageing.overYears) * (age - lens.baseAge)) +
    log.constant +
    p1 * (log.size + log.size2 * p1 + log.sizeLight * p2) +
    p2 * (log.light + log.light2 * p2)
  )
}

/**
 * Threshold contrast Ct (1 − Y_ink/Y_page): the least an observer sees. Falls with light, rises with age.
 * @returns above 0; +∞ outside the model, where no contrast is enough
 * @throws RangeError when the luminance is negative or not finite, the age not in 20–65, or the size not above 0
 * @see THRESHOLD_MODEL
 */
export function thresholdContrast({ luminance, age, size }: Sight): number {
  if (!(luminance >= 0 && luminance < Infinity)) {
    throw new RangeError(`Luminance must be 0 cd/m² or more and finite, got ${luminance}`)
  }
  if (!(age >= lowestAge && age <= highestAge)) throw new RangeError(`Age must be from 20 to 65 years, got ${age}`)
  if (!(size > 0 && size < Infinity)) throw new RangeError(`Size must be above 0 microsteradians, got ${size}`)
  return 10 ** log10ThresholdContrast(luminance, age, size)
}

/**
 * Contrast reserve R = C/Ct: how many times more contrast than the eye needs. Always finite.
 * @param sight contrast C of ink on page (0–1), luminance of the page in cd/m², age 20–65 years, size in microsteradians
 * @returns 0 where the page is too dark for the model, or has no contrast
 * @throws RangeError when the contrast is not in 0–1, and as `thresholdContrast`
 */
export function contrastReserve({ contrast, ...sight }: Sight & { contrast: number }): number {
  if (!(contrast >= 0 && contrast <= 1)) throw new RangeError(`Contrast must be from 0 to 1, got ${contrast}`)
  return contrast / thresholdContrast(sight)
}
