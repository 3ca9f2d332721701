import type { Edition, EditionDevice, Lab } from '@/lib/method/types'
import { COVERAGE_FACTOR, propagate } from '@/lib/stats/uncertainty'

/** A figure made of a device's two states, such as lightness or contrast. */
export type Quantity = (states: { page: Lab; ink: Lab }) => number

export type Measured = Pick<EditionDevice, 'slug' | 'page' | 'ink' | 'sessions'>
export type Doubts = Pick<Edition, 'uncertainty'>

/** Errors are drawn up in threes, L*, a*, b*: page and ink of the one, of the other, the common ones, each session's. */
const PAGE_OF_ONE = 0
const PAGE_OF_OTHER = 6
const COMMON = 12
const SESSIONS = 15

/** A figure made of the states of two devices, such as the colour difference of their pages. */
export type PairQuantity = (one: States, other: States) => number
type States = Parameters<Quantity>[0]

/**
 * Expanded uncertainty (k = 2) of a figure of two devices of an edition. The errors they share are one input each, so
 * what is common to both drops out where the figure is a difference: the calibration wholly where it is taken alike, and
 * a session as far as both were measured in it. First order, by numerical derivatives; Method 1, section 1.
 * @see JCGM 100:2008, 5.1.2
 */
export function pairDoubt({ uncertainty }: Doubts, one: Measured, other: Measured, quantity: PairQuantity): number {
  const sessions = [...new Set([...Object.keys(one.sessions), ...Object.keys(other.sessions)])]
  const sizes = [
    ...[one.page.u, one.ink.u, other.page.u, other.ink.u, uncertainty.common],
    ...sessions.map(() => uncertainty.session),
  ].flatMap(({ L, a, b }) => [L, a, b])

  function shiftedBy(errors: readonly number[], device: Measured, ownFrom: number): States {
    const shared = sessions.reduce(
      (sum, id, i) => plus(sum, three(errors, SESSIONS + 3 * i), device.sessions[id] ?? 0),
      three(errors, COMMON),
    )
    const shifted = (state: Lab, from: number) => plus(plus(state, three(errors, from)), shared)
    return { page: shifted(device.page, ownFrom), ink: shifted(device.ink, ownFrom + 3) }
  }

  const figure = (errors: number[]) =>
    quantity(shiftedBy(errors, one, PAGE_OF_ONE), shiftedBy(errors, other, PAGE_OF_OTHER))
  return COVERAGE_FACTOR * propagate(figure, Array(sizes.length).fill(0), sizes)
}

/** Expanded uncertainty (k = 2) of the difference of one figure between two devices of an edition. */
export function differenceDoubt(doubts: Doubts, one: Measured, other: Measured, quantity: Quantity): number {
  return pairDoubt(doubts, one, other, (states, others) => quantity(states) - quantity(others))
}

function three(errors: readonly number[], from: number): Lab {
  return { L: errors[from]!, a: errors[from + 1]!, b: errors[from + 2]! }
}

function plus(one: Lab, other: Lab, share = 1): Lab {
  return { L: one.L + share * other.L, a: one.a + share * other.a, b: one.b + share * other.b }
}

/** Whether two devices' figures differ by no more than the doubt of their difference. */
export function withinDoubt(doubts: Doubts, one: Measured, other: Measured, quantity: Quantity): boolean {
  return Math.abs(quantity(one) - quantity(other)) <= differenceDoubt(doubts, one, other, quantity)
}
