import { type Column, DEVICE, labColumns, type Table } from './table'

export const UNCERTAINTY_PARTS = [
  'common',
  'session',
  'page-reading',
  'page-position',
  'page-unit',
  'ink-reading',
  'ink-position',
  'ink-unit',
  'paper',
] as const

/** A figure and its doubt beside it. */
function figure(name: string, unit: string, meaning: string, empty?: string): Column[] {
  return [
    { name, type: 'number', unit, meaning, ...(empty && { empty }) },
    {
      name: `${name}_doubt`,
      type: 'number',
      unit,
      meaning: `Expanded uncertainty of ${name}, k = 2, about 95 %.`,
      ...(empty && { empty }),
    },
  ]
}

/** Standard uncertainty of the device's own part, per channel. */
function own(state: string): Column[] {
  return (['l', 'a', 'b'] as const).map((channel) => ({
    name: `${state}_${channel}_u`,
    type: 'number',
    unit: `${channel === 'l' ? 'L' : channel}*`,
    meaning: `Standard uncertainty (k = 1) of ${state}_${channel}, the device’s own part alone: units, positions, readings.`,
  }))
}

const NEUTRAL = 'The page is neutral and has no hue.'

export const FIGURES: Table = {
  name: 'figures',
  title: 'Published figures',
  description:
    'One row a device: every figure the guide publishes of it, with its doubt. Frozen figures have the decimals of the edition document; what follows from them is rounded to four.',
  key: ['device'],
  references: [{ columns: ['device'], table: 'devices', to: ['device'] }],
  columns: [
    DEVICE,
    ...figure('page_l', 'L*', 'Lightness L* of the page, d/8°, specular included, D65, 10°.'),
    ...figure('page_a', 'a*', 'a* of the page, − green to + red.'),
    ...figure('page_b', 'b*', 'b* of the page, − blue to + yellow.'),
    ...labColumns('the ink', 'ink_'),
    ...own('page'),
    ...own('ink'),
    ...figure('whiteness', '1', 'CIE whiteness W10 of the page; outside the formula’s limits on electronic paper.'),
    ...figure('tint', '1', 'CIE tint T10 of the page, + greenish; outside the formula’s limits on electronic paper.'),
    {
      name: 'within_limits',
      type: 'boolean',
      meaning: 'Whether whiteness and tint lie within the limits CIE states for its formula.',
    },
    ...figure('contrast', '1', 'Contrast ratio Y page / Y ink, d/8°, specular included.'),
    ...figure('chroma', 'C*ab', 'Chroma C*ab of the page.'),
    ...figure('hue', 'deg', 'Hue angle of the page, from + a* towards + b*.', NEUTRAL),
    ...figure('page_y', '%', 'Luminance factor Y of the page.'),
    ...figure('ink_y', '%', 'Luminance factor Y of the ink.'),
    ...figure('from_paper', 'ΔE00', 'Colour difference of the page from the control paper, CIEDE2000.'),
    ...figure('times_the_light', '1', 'How many times the light of the control paper the page needs to look as light.'),
  ],
}

export const UNCERTAINTY: Table = {
  name: 'uncertainty',
  title: 'Shared parts of the doubt',
  description:
    'One row a part, as standard deviations: what is common to every figure, what the sets of a session share, and the spreads pooled over the edition. The last row is the control paper’s own colour.',
  key: ['part'],
  columns: [
    {
      name: 'part',
      type: 'text',
      meaning:
        'common: calibration and certificate; session: between sessions, from the control tile; reading, position, unit: within sets, between positions of a unit, between units of a model, of page and ink; paper: colour of the control paper, not a doubt.',
      words: UNCERTAINTY_PARTS,
    },
    ...labColumns('this part'),
  ],
}
