import { D65_10 } from '@/lib/colour/white'
import { WHITENESS_D65_10, WHITENESS_FACTORS, WHITENESS_LIMITS } from '@/lib/colour/whiteness'
import type { Constant } from '@/lib/method/constants'
import { PRINT_LIGHTNESS } from '@/lib/quiz/in-light'
import { GRUBBS_ALPHA } from '@/lib/stats/grubbs'
import { MODEL_RANGE, THRESHOLD_MODEL } from '@/lib/vision/contrast-reserve'

const published = (name: string, value: unknown, source: string, unit?: string, note?: string): Constant => ({
  name,
  value,
  unit,
  source,
  standing: 'published',
  note,
})
const house = (name: string, value: unknown, unit?: string, note?: string): Constant => ({
  name,
  value,
  unit,
  source: 'chosen by Lampleaf',
  standing: 'house',
  note,
})

const { xn, yn, tintX, source } = WHITENESS_D65_10
const { lowest, perY, belowY, tintLowest, tintHighest } = WHITENESS_LIMITS

/** Constants of colour, beside those of the method itself: the same objects the figures are computed with. */
export const COLOUR_CONSTANTS: Constant[] = [
  published('Reference white, D65 and 10° observer', D65_10, 'ASTM E308', undefined, 'L*a*b* to XYZ and back.'),
  published('Chromaticity of that white in the whiteness formula', { xn, yn }, source),
  published(
    'Factors of the whiteness formula',
    { 'xₙ − x': WHITENESS_FACTORS.x, 'yₙ − y': WHITENESS_FACTORS.y },
    WHITENESS_FACTORS.source,
  ),
  published(
    'Factors of the tint formula, 10° observer',
    { 'xₙ − x': tintX, 'yₙ − y, taken off': WHITENESS_FACTORS.tintY },
    source,
  ),
  {
    name: 'Level of Grubbs’ test, both sides together',
    value: GRUBBS_ALPHA,
    source: 'Grubbs & Beck 1972, Technometrics 14(4); the level is usual',
    standing: 'common practice',
  },
  published(
    'Limits of whiteness',
    { above: lowest, 'below, times Y': perY, less: belowY },
    'CIE 15',
    undefined,
    'Both ends are outside.',
  ),
  published('Limits of tint', { above: tintLowest, below: tintHighest }, 'CIE 15', undefined, 'Both ends are outside.'),
]

const { pupil, lens, ageing, log, size, source: model } = THRESHOLD_MODEL

/** Constants of the threshold model and of the range we use it in. */
export const VISION_CONSTANTS: Constant[] = [
  published('Pupil radius, mm', { 'middle, mm': pupil.middle, 'swing, mm': pupil.swing, slope: pupil.slope }, model),
  published('Light lost in the ageing lens', { 'a year': lens.lossPerYear, 'from age': lens.baseAge }, model),
  published('Rise of the threshold with age', { 'by this share': ageing.rise, 'over years': ageing.overYears }, model),
  published('Target size', { 'a steradian': size.perSteradian }, model),
  published(
    'Terms of the logarithm of the threshold',
    {
      constant: log.constant,
      'p₁': log.size,
      'p₂': log.light,
      'p₁²': log.size2,
      'p₂²': log.light2,
      'p₁·p₂': log.sizeLight,
    },
    model,
  ),
  house('Page luminance below which nothing is said to be readable', MODEL_RANGE.lowestLuminance, 'cd/m²'),
  house('Page luminance above which more counts as this', MODEL_RANGE.highestLuminance, 'cd/m²'),
  house(
    'Least log(10·I/π) the model is used at',
    MODEL_RANGE.lowestLogRetinal,
    undefined,
    'Binds only for the largest light need, below 0.0533 cd/m².',
  ),
  house('Print on the control paper, where a chart shows it', PRINT_LIGHTNESS, 'L*', 'That of the bright reference.'),
  {
    name: 'Ages the model is written for',
    value: { from: MODEL_RANGE.lowestAge, to: MODEL_RANGE.highestAge },
    unit: 'years',
    source: model,
    standing: 'from memory',
  },
]
