import type { SpotSlug } from '@/lib/method/spots'
import type { NamedSpot } from './request'

const PHRASES: Record<SpotSlug, string> = {
  'bed-dark': 'in bed with the lights off',
  'bed-far-lamp': 'in bed with one dim lamp far away',
  'cafe-evening': 'in a café in the evening',
  'sofa-evening': 'in the living room by the ceiling light',
  'bed-lamp': 'by your bedside lamp',
  train: 'on the train',
  'armchair-lamp': 'in the armchair by the reading lamp',
  desk: 'at your desk',
  window: 'beside a window',
  shade: 'outdoors in the shade',
  sun: 'in full sun',
}

/** A spot as part of a sentence: "by your bedside lamp". */
export function spotPhrase({ slug, name }: Pick<NamedSpot, 'slug' | 'name'>): string {
  return slug && Object.hasOwn(PHRASES, slug) ? PHRASES[slug as SpotSlug] : `in “${name}”`
}
