import * as z from 'zod/mini'
import { shown } from '@/lib/contract/shown'

/** Decimals kept of a number in the address: a ten-thousandth of an hour, a lux or a pound is nothing. */
const DECIMALS = 4

/**
 * A value as it stands in an address or a form: a text that `read` understands, or refused with what it should be.
 * @param read returns undefined for what it does not understand
 */
function fromText<T>(read: (text: string) => T | undefined, right: string) {
  return z.pipe(
    z.string(),
    z.transform((text, context): T => {
      const value = read(text.trim())
      if (value !== undefined) return value
      context.issues.push({ code: 'custom', input: text, message: `${shown(text.trim())} is not ${right}` })
      return z.NEVER
    }),
  )
}

/**
 * A number as people type it: "8,000", "£300", ".5", "−2", thin spaces and all; undefined where it is none. What no
 * quiz could mean (Infinity, 1e9, hexadecimal) is none either.
 */
export function plainNumber(text: string): number | undefined {
  const bare = text
    .replace(/[\s\u202f]/g, '')
    .replace(/^£/, '')
    .replace(/^−/, '-')
  if (!/\d/.test(bare) || !/^-?(\d{1,9}|\d{1,3}(,\d{3}){1,2})?(\.\d{0,12})?$/.test(bare)) return undefined
  const value = Number(Number(bare.replaceAll(',', '')).toFixed(DECIMALS))
  // −0 is written as 0, so it must be read as 0.
  return value === 0 ? 0 : value
}

/** A number between two bounds, both allowed; `right` says them in words with the unit. */
export function numberBetween(low: number, high: number, right: string) {
  return fromText((text) => {
    const value = plainNumber(text)
    return value !== undefined && value >= low && value <= high ? value : undefined
  }, right)
}

/** A price in pounds as pence. */
export function pence(most: number, right: string) {
  return fromText((text) => {
    const pounds = plainNumber(text)
    const amount = pounds === undefined ? -1 : Math.round(pounds * 100)
    return amount >= 0 && amount <= most ? amount : undefined
  }, right)
}

/** One of a few words, and what each stands for. */
export function oneOf<const T>(meanings: readonly (readonly [word: string, value: T])[]) {
  const right = `one of the choices (${meanings.map(([word]) => word).join(', ')})`
  return fromText((text) => meanings.find(([word]) => word === text)?.[1], right)
}

export const wordsOf = <const T extends string>(words: readonly T[]) => words.map((word) => [word, word] as const)

// Control characters, halves of surrogate pairs, letters of nobody, and marks that turn the direction of what follows.
const UNFIT = /[\p{Cc}\p{Cs}\p{Co}\p{Cn}\u202a-\u202e\u2066-\u2069]/u

/** A few words on one line. */
export function lineOfText(longest: number, right: string) {
  return fromText((text) => (text.length <= longest && !UNFIT.test(text) ? text : undefined), right)
}

/** Words with commas between, each of which is understood; each once, in the order given. */
export function listOf<T>(read: (part: string) => T | undefined, most: number, right: string) {
  return fromText((text) => {
    const parts = text
      .split(',')
      .map((part) => part.trim())
      .filter((part) => part !== '')
      .map(read)
    return parts.includes(undefined) || parts.length > most ? undefined : [...new Set(parts as T[])]
  }, right)
}
