import { z } from 'zod'
import { shown } from './shown'

/** The message of a refused value: what it was, and what would be right. */
export const instead = (right: string) => (issue: { input?: unknown }) => `is ${shown(issue.input)}; give ${right}`

/** A finite number between two bounds, both allowed; `what` says them in words with the unit. */
export function numberFrom(low: number, high: number, what: string) {
  const error = instead(what)
  return z.number({ error }).min(low, { error }).max(high, { error })
}

/** A whole number between two bounds, both allowed. */
export function wholeFrom(low: number, high: number, what: string) {
  const error = instead(what)
  return z.number({ error }).int({ error }).min(low, { error }).max(high, { error })
}

export const truth = () => z.boolean({ error: instead('true or false') })

/** One word of a fixed list. */
export function oneOf<const T extends readonly [string, ...string[]]>(words: T) {
  return z.enum(words, { error: instead(words.map((word) => `"${word}"`).join(' or ')) })
}

/** Text of one line that matches a pattern. The patterns admit neither U+0000 nor half a surrogate pair. */
export function textLike(pattern: RegExp, what: string) {
  const error = instead(what)
  return z.string({ error }).regex(pattern, { error })
}

/** An object with these fields and no other. */
export function strictObject<T extends z.core.$ZodLooseShape>(shape: T, what = 'an object') {
  const known = Object.keys(shape).join(', ')
  return z.strictObject(shape, {
    error: (issue) =>
      issue.code === 'unrecognized_keys' ? `is not a known field; the fields here are ${known}` : instead(what)(issue),
  })
}

/** A list; `what` says in words what it holds and how many. */
export function listOf<T extends z.core.$ZodType>(item: T, least: number, most: number, what: string) {
  const error = (issue: { input?: unknown; code?: string }) =>
    issue.code === 'too_big' ? `has ${(issue.input as unknown[]).length} entries; give ${what}` : instead(what)(issue)
  return z.array(item, { error }).min(least, { error }).max(most, { error })
}
