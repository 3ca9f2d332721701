import { DEFAULT_ANSWERS } from './spots'
import type { Answers } from './types'

/** The parts of an answer that take a default, in the order of the contract. */
const PARTS = ['spots', 'lightNeed', 'text', 'preferredWhite', 'aims', 'reads', 'hold', 'limits'] as const

/**
 * Fills what a reader did not answer with the defaults of Method 1, section 0, and names it. Aims are not missed where
 * weights were set by hand: they stand in for them.
 */
export function completeAnswers(partial: Partial<Answers>): { answers: Answers; assumed: string[] } {
  const given = Object.fromEntries(Object.entries(partial).filter(([, value]) => value !== undefined))
  const answers: Answers = { ...structuredClone(DEFAULT_ANSWERS), ...given }
  const assumed = PARTS.filter((part) => !(part in given) && !(part === 'aims' && answers.weights !== null))
  return { answers, assumed }
}
