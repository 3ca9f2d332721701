import type { Answers } from './types'

/** The reading spots of Method 1, section 0, darkest first. Lux are bands' middles (common practice, no source). */
export const SPOTS = [
  { slug: 'bed-dark', lux: 0.1, frontLight: true, name: 'In bed, lights off' },
  { slug: 'bed-far-lamp', lux: 5, frontLight: true, name: 'In bed, one dim lamp far away' },
  { slug: 'cafe-evening', lux: 50, frontLight: true, name: 'Café or bar, evening' },
  { slug: 'sofa-evening', lux: 70, frontLight: true, name: 'Living room, ceiling light only' },
  { slug: 'bed-lamp', lux: 80, frontLight: true, name: 'In bed, small lamp at arm’s length' },
  { slug: 'train', lux: 200, frontLight: false, name: 'Train, bus, café by day' },
  { slug: 'armchair-lamp', lux: 250, frontLight: false, name: 'Armchair, lamp over the shoulder' },
  { slug: 'desk', lux: 400, frontLight: false, name: 'Office or study desk' },
  { slug: 'window', lux: 1000, frontLight: false, name: 'Beside a window, no sun on the page' },
  { slug: 'shade', lux: 8000, frontLight: false, name: 'Outdoors, shade or overcast' },
  { slug: 'sun', lux: 80000, frontLight: false, name: 'Outdoors, full sun' },
] as const
export type SpotSlug = (typeof SPOTS)[number]['slug']

export const MAX_SPOTS = 12

/** What is assumed where a reader does not answer: Method 1, section 0. */
export const DEFAULT_ANSWERS: Answers = {
  spots: [
    { lux: 80, hours: 5, frontLight: true },
    { lux: 200, hours: 2, frontLight: false },
  ],
  lightNeed: 'usual',
  text: 'normal',
  preferredWhite: 'neutral',
  aims: [['clarity', 'whiteness', 'tint', 'handling']],
  weights: null,
  reads: { novels: 3, articles: 1 },
  hold: 'two-hands',
  limits: {},
}
