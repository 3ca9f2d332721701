import type { ScoredDevice } from './types'

/** By fit, equal fits by slug: the order of every ranking. */
export function byFit(one: Pick<ScoredDevice, 'slug' | 'fit'>, other: Pick<ScoredDevice, 'slug' | 'fit'>): number {
  return other.fit - one.fit || (one.slug < other.slug ? -1 : one.slug > other.slug ? 1 : 0)
}
