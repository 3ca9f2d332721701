import { COVERAGE_FACTOR } from '@/lib/stats/uncertainty'
import { READING_ANCHORS } from '@/lib/vision/contrast-reserve'

/**
 * Every constant of Method 1 that this folder uses, once: the code computes with `value`, the Method page prints the
 * rest. Constants of colour (the D65/10° white, the whiteness formula) and of vision (the threshold model) stand with
 * their formulas in lib/colour and lib/vision.
 */

/** How far a constant can be trusted: printed where we could read it, recalled, chosen by us, or only customary. */
export type Standing = 'published' | 'from memory' | 'house' | 'common practice'

export type Constant<T = unknown> = {
  /** What it is, in plain words. */
  name: string
  value: T
  unit?: string
  source: string
  standing: Standing
  note?: string
}

function house<const T>(name: string, value: T, unit?: string, note?: string): Constant<T> {
  return { name, value, unit, source: 'chosen by Lampleaf', standing: 'house', note }
}

const FLUENCY = READING_ANCHORS.source
const FLUENCY_NOTE =
  'Theirs is for letters, the model’s thresholds for targets of reading-task size; carrying it over is house.'
const ROC = 'Barron & Barrett, Management Science 42(11), 1996'
const CAM = 'CIE 248:2022 (CIECAM16)'

/** Section 1: from readings to a figure. */
const FIGURES = {
  unitFloor: house(
    'Least standard deviation between units of a model',
    { L: 0.5, a: 0.3, b: 0.4 },
    undefined,
    'Used while fewer than three models have two or more measured units.',
  ),
  modelsForUnitSpread: house('Models with two or more units from which the floor is dropped', 3),
  coverage: {
    name: 'Coverage factor k of an expanded uncertainty',
    value: COVERAGE_FACTOR,
    source: 'JCGM 100:2008, 6.2',
    standing: 'published',
    note: 'About 95 %.',
  } as Constant<number>,
  leastLightness: house('Lightest page refused', 20, 'L*', 'Below it Y and whiteness lose their meaning.'),
  leastReadings: {
    name: 'Readings in a set, at least',
    value: 5,
    source: 'common practice, no source',
    standing: 'common practice',
  } as Constant<number>,
}

/** Section 2: light on the page. */
const LIGHT = {
  comfort: house('Page luminance a front light is turned up to', 15, 'cd/m²', 'A comfortable page in a dark room.'),
  mostLux: house('Brightest light a spot may have', 200_000, 'lx'),
  mostHours: {
    name: 'Hours in a week',
    value: 168,
    unit: 'h',
    source: '7 × 24',
    standing: 'published',
  } as Constant<number>,
}

/** Section 3: contrast reserve. */
const RESERVE = {
  spotReading: {
    name: 'Reserve for spot reading',
    value: READING_ANCHORS.spot,
    source: FLUENCY,
    standing: 'from memory',
    note: `Below it a spot counts as unreadable. ${FLUENCY_NOTE}`,
  } as Constant<number>,
  fluentReading: {
    name: 'Reserve for fluent reading',
    value: READING_ANCHORS.fluent,
    source: FLUENCY,
    standing: 'from memory',
    note: FLUENCY_NOTE,
  } as Constant<number>,
  bestReading: {
    name: 'Reserve for the best reading rate',
    value: READING_ANCHORS.best,
    source: FLUENCY,
    standing: 'from memory',
    note: `More is not rewarded. ${FLUENCY_NOTE}`,
  } as Constant<number>,
  age: house(
    'Observer age a light need stands for',
    { usual: 25, more: 50, 'much-more': 65 },
    'years',
    'Asked as a need of light, never as age.',
  ),
  size: house('Target size a type size stands for', { small: 2, normal: 4.8, large: 10 }, 'µsr'),
}

/** Section 4: the four criteria. */
const CRITERIA = {
  brightPage: house('Bright reference page', { L: 80, a: 0, b: 0 }, 'L*a*b*'),
  brightInk: house('Ink of the bright reference page', 20, 'L*'),
  dimPage: house('Dim reference page', { L: 50, a: -3, b: 5 }, 'L*a*b*'),
  dimInk: house('Ink of the dim reference page', 28, 'L*'),
  referenceFrontLight: house('Front light of both reference pages, where one may be used', 80, 'cd/m²'),
  alike: house('Range of clarity below which the reference pages read alike', 1e-6),
  preferredWhite: house(
    'White a reader prefers',
    { neutral: { a: 0, b: 0 }, warm: { a: 0, b: 4 }, cool: { a: 0, b: -3 } },
    'a*, b*',
    'A page earns nothing for being bluer than this: whiteness rises steeply with blueness.',
  ),
  tintSpan: house('Distance from the preferred white at which tint scores 0', 6, 'ΔC*ab'),
}

/** Section 4: handling. */
const HANDLING = {
  hold: house('Weight of lightness in the hand', { 'one-hand': 1, 'two-hands': 0.5, table: 0 }),
  heaviest: house('Weight that scores 0', 600, 'g'),
  weightSpan: house('Grams below that for the full score', 450, 'g'),
  coarsest: house('Resolution that scores 0', 150, 'ppi'),
  resolutionSpan: house('Pixels per inch above that for the full score', 150, 'ppi'),
  sizeShare: house('Weight of the size term', 1),
  resolutionShare: house('Weight of the resolution term', 0.5),
  sizes: house(
    'Diagonals that suit a kind of reading',
    {
      novels: [5, 6, 7.8, 10.5],
      documents: [7, 10, 13.5, 16],
      comics: [6, 7.8, 11, 14],
      notes: [7, 9.7, 13.5, 16],
      articles: [5, 6.8, 10.5, 13],
    },
    'in',
    '0 at the outer, 1 between the inner numbers.',
  ),
}

/** Section 5: weights. */
const WEIGHTS = {
  centroid: {
    name: 'Rank-order-centroid weights of four aims',
    value: 'wᵢ = ¼·Σⱼ≥ᵢ 1/j',
    source: ROC,
    standing: 'from memory',
    note: '0.5208, 0.2708, 0.1458, 0.0625; tied aims share the mean of their places.',
  } as Constant<string>,
  referenceLux: house('Light in which nothing is multiplied', 500, 'lx', 'Usual need, normal text, no front light.'),
  clarityLeast: house('Least the light multiplies clarity by', 0.1),
  clarityMost: house('Most the light multiplies clarity by', 3),
  leastLux: house('Least light the colourfulness part is taken at', 1, 'lx'),
  adaptingShare: {
    name: 'Luminance factor of the surroundings one adapts to',
    value: 0.2,
    source: CAM,
    standing: 'from memory',
  } as Constant<number>,
  adaptation: {
    name: 'Terms of F_L',
    value: { 'low light': 0.2, light: 5, 'high light': 0.1, root: 3 },
    source: CAM,
    standing: 'from memory',
  } as Constant<{ 'low light': number; light: number; 'high light': number; root: number }>,
  colourfulnessPower: {
    name: 'Power of F_L in colourfulness',
    value: 0.25,
    source: CAM,
    standing: 'from memory',
  } as Constant<number>,
}

/** Section 6: ties and ranks. */
const TIES = {
  draws: house('Draws of the Monte Carlo', 4000, undefined, 'At least; JCGM 101 is the manner.'),
  clearlyAheadPercent: house('Share of draws strictly ahead that settles a pair', 95, '%'),
  rankLowPermille: house('Lower percentile of the rank interval', 25, '‰', 'Nearest rank, element ⌈p·n⌉.'),
  rankHighPermille: house('Upper percentile of the rank interval', 975, '‰', 'Nearest rank, element ⌈p·n⌉.'),
}

/** Section 7: limits, and what would change the answer. */
const CHANGES = {
  manyLimits: house('Limits above which we warn', 3),
  fewDevices: house('Devices left below which we warn', 3),
  touching: house(
    'Lead in points, or stretch of weights, that counts as level',
    1e-9,
    undefined,
    'Rounding: to touch is not to overtake.',
  ),
  hourStep: house('Step in which hours are moved between spots', 0.5, 'h'),
}

/** By section of Method 1; the Method page lists them in this order. */
export const METHOD = {
  figures: FIGURES,
  light: LIGHT,
  reserve: RESERVE,
  criteria: CRITERIA,
  handling: HANDLING,
  weights: WEIGHTS,
  ties: TIES,
  changes: CHANGES,
}
