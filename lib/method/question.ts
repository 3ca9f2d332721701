import type { Answers } from './types'

/** Digits to which shares are told apart, so that the same week in other units is the same question. */
const DIGITS = 12

/**
 * The canonical text of everything in an answer that scores: it seeds the draws. Limits are left out, so that taking a
 * device away by a limit leaves the draws of the others alone; so are aims where weights were set by hand, spots of 0
 * hours, and the scale of hours, readings and weights.
 */
export function questionText(answers: Answers): string {
  const { spots, lightNeed, text, preferredWhite, aims, weights, reads, hold } = answers
  const hours = spots.reduce((sum, spot) => sum + spot.hours, 0)
  const used = spots.filter((spot) => spot.hours > 0)
  return JSON.stringify({
    // In an order of their own: naming the same places another way round is the same question.
    spots: used.map((spot) => JSON.stringify([spot.lux, share(spot.hours, hours), spot.frontLight])).sort(),
    lightNeed,
    text,
    preferredWhite,
    aims: weights ? null : aims.filter((group) => group.length > 0).map((group) => [...group].sort()),
    weights: weights && shares(weights),
    reads: shares(reads),
    hold,
  })
}

function shares(amounts: Record<string, number>): [string, number][] {
  const positive = Object.entries(amounts).filter(([, amount]) => amount > 0)
  const largest = Math.max(...positive.map(([, amount]) => amount))
  const total = positive.reduce((sum, [, amount]) => sum + amount / largest, 0)
  return positive.map(([name, amount]): [string, number] => [name, share(amount / largest, total)]).sort(byName)
}

function byName([one]: [string, number], [other]: [string, number]): number {
  return one < other ? -1 : one > other ? 1 : 0
}

function share(part: number, whole: number): number {
  return Number((part / whole).toPrecision(DIGITS))
}
