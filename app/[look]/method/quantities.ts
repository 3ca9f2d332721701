/** One figure we publish, and the section of the Method page that says how it comes about. */
export type Quantity = {
  /** Its place on the page, `/method#q-…`; figures elsewhere link to it. */
  id: string
  name: string
  symbol?: { base: string; sub?: string }
  unit: string
  section: 'figures' | 'light' | 'reserve' | 'criteria' | 'weights' | 'fit' | 'limits'
  /** Where it stands in the API's documents: a device of an edition (`device.…`) or an answer (`answer.…`). */
  fields: string[]
  how: string
}

/** Every figure we publish. The tests hold this list to the API's documents: a new field without a method fails them. */
export const QUANTITIES: Quantity[] = [
  {
    id: 'lightness',
    name: 'Lightness of page and ink',
    symbol: { base: 'L*' },
    unit: '0 black to 100 white',
    section: 'figures',
    fields: ['device.page.L', 'device.ink.L', 'edition.control.paper.L'],
    how: 'Mean of the accepted readings of a set, then of a unit’s sets, then of the units.',
  },
  {
    id: 'a-b',
    name: 'Green to red, blue to yellow',
    symbol: { base: 'a*, b*' },
    unit: 'CIELAB units, 0 neutral',
    section: 'figures',
    fields: [
      'device.page.a',
      'device.page.b',
      'device.ink.a',
      'device.ink.b',
      'edition.control.paper.a',
      'edition.control.paper.b',
    ],
    how: 'Meant like lightness. Negative a* is greenish, negative b* bluish.',
  },
  {
    id: 'uncertainty',
    name: 'Doubt of a figure',
    symbol: { base: '±' },
    unit: 'that of the figure',
    section: 'figures',
    fields: [
      'device.page.u',
      'device.ink.u',
      'device.sessions',
      'edition.uncertainty.common',
      'edition.uncertainty.session',
    ],
    how: 'Expanded uncertainty, k = 2, about 95 %, from the device’s own part, its sessions’ and the calibration’s.',
  },
  {
    id: 'luminance-factor',
    name: 'Light given back by page and ink',
    symbol: { base: 'Y' },
    unit: '% of a perfect diffuser',
    section: 'figures',
    fields: [],
    how: 'From L* alone, against the white of D65 and the 10° observer.',
  },
  {
    id: 'whiteness',
    name: 'CIE whiteness of the page',
    symbol: { base: 'W', sub: '10' },
    unit: 'none',
    section: 'figures',
    fields: ['device.whiteness', 'device.withinLimits'],
    how: 'The CIE formula outside its stated limits, marked †; never the order of a list unless you ask.',
  },
  {
    id: 'tint',
    name: 'CIE tint of the page',
    symbol: { base: 'T', sub: '10' },
    unit: 'none; positive greenish, negative reddish',
    section: 'figures',
    fields: ['device.tint'],
    how: 'The CIE formula outside its stated limits, marked †.',
  },
  {
    id: 'chroma',
    name: 'Chroma and hue angle of the page',
    symbol: { base: 'C*', sub: 'ab' },
    unit: 'CIELAB units; degrees',
    section: 'figures',
    fields: [],
    how: 'Distance of the page from neutral, √(a*² + b*²), and its direction.',
  },
  {
    id: 'contrast',
    name: 'Contrast ratio',
    symbol: { base: 'Y', sub: 'page/ink' },
    unit: 'to 1, d/8°, specular included',
    section: 'figures',
    fields: ['device.contrast'],
    how: 'Light given back by the page over that of the ink. Ratios of other geometries are other numbers.',
  },
  {
    id: 'difference',
    name: 'Difference from the control paper',
    symbol: { base: 'ΔE', sub: '00' },
    unit: 'CIEDE2000 units',
    section: 'figures',
    fields: [],
    how: 'Colour difference of the page from the named control paper, ISO/CIE 11664-6.',
  },
  {
    id: 'light-needed',
    name: 'Times the light of the control paper',
    symbol: { base: 'n' },
    unit: 'times',
    section: 'figures',
    fields: [],
    how: 'Y of the control paper over Y of the page: how much more light makes this page as bright as that paper.',
  },
  {
    id: 'front-light',
    name: 'Front light, most and least',
    unit: 'cd/m² on a white page',
    section: 'light',
    fields: ['device.frontLight'],
    how: 'Read with a luminance meter in a dark room. The most enters the light on the page; the least is shown only.',
  },
  {
    id: 'reserve',
    name: 'Contrast reserve',
    symbol: { base: 'R' },
    unit: 'times',
    section: 'reserve',
    fields: ['answer.ranked.unreadable'],
    how: 'Contrast of ink on page over the least contrast the eye sees there; under 3 a spot counts as unreadable.',
  },
  {
    id: 'scores',
    name: 'Scores of clarity, whiteness, tint and handling',
    unit: '0 to 1',
    section: 'criteria',
    fields: ['answer.ranked.scores', 'answer.ranked.notStated'],
    how: 'Each between two fixed reference pages, so that a new device never reorders the others.',
  },
  {
    id: 'weights',
    name: 'Weights and what the light multiplies them by',
    unit: 'shares of 1; times',
    section: 'weights',
    fields: ['answer.weights', 'answer.multipliers'],
    how: 'From the order of your aims, multiplied by your light; or set by hand.',
  },
  {
    id: 'fit',
    name: 'Fit and the points of each aim',
    unit: 'points, 0 to 100',
    section: 'fit',
    fields: ['answer.ranked.fit', 'answer.ranked.contributions'],
    how: 'Weights times scores, summed, less the share of hours in which nothing can be read.',
  },
  {
    id: 'ranks',
    name: 'Spread of the fit, first-place share, rank interval, ties',
    unit: 'points; share of draws; places',
    section: 'fit',
    fields: ['answer.ranked.sd', 'answer.ranked.first', 'answer.ranked.rank95', 'answer.ranked.tiedWith'],
    how: 'From 4,000 or more draws of the measurement errors.',
  },
  {
    id: 'limits',
    name: 'Excluded devices and near misses',
    unit: 'that of the limit',
    section: 'limits',
    fields: ['answer.excluded', 'answer.nearMisses'],
    how: 'Only what is known to fail a limit goes; what is not stated stays, with a note.',
  },
  {
    id: 'would-change',
    name: 'What would change first place',
    unit: 'weight; hours; money',
    section: 'limits',
    fields: ['answer.wouldChange'],
    how: 'The smallest change of one weight, the fewest hours moved, the lowest higher budget.',
  },
]
