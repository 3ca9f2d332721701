import { completeAnswers } from '@/lib/method/answers'
import type { Answers } from '@/lib/method/types'
import type { MatchRequest } from './match-request'

/** The currency of a budget that names none: that of the shops where the team notes its prices. */
export const DEFAULT_CURRENCY = 'GBP'

/**
 * A request's answers with every default of Method 1 filled in, and the fields that were missing: `edition` and
 * `limits.currency` (only where a budget stands without one) besides those the method itself fills.
 */
export function completeRequest({ edition, ...given }: MatchRequest): { answers: Answers; assumed: string[] } {
  const { limits } = given
  const currencyMissing = limits?.budget !== undefined && limits.currency === undefined
  const { answers, assumed } = completeAnswers(
    currencyMissing ? { ...given, limits: { ...limits, currency: DEFAULT_CURRENCY } } : given,
  )
  return {
    answers,
    assumed: [
      ...(edition === undefined ? ['edition'] : []),
      ...assumed,
      ...(currencyMissing ? ['limits.currency'] : []),
    ],
  }
}
