import type { Edition, EditionDevice, Lab } from '@/lib/method/types'
import { COVERAGE_FACTOR, propagate } from '@/lib/stats/uncertainty'

/** A figure made of a device's two states, such as lightness or contrast. */
export type Quantity = (states: { page: Lab; ink: Lab }) => number

export type Measured = Pick<EditionDevice, 'slug' | 'page' | 'ink' | 'sessions'>
export type Doubts = Pick<Edition, 'uncertainty'>

const CHANNELS = ['L', 'a', 'b'] as const

/**
 * Expanded uncertainty (k = 2) of the difference of one figure between two devices of an edition. The errors they share
 * are one input each, so what is common to both drops out: the calibration wholly where the figure takes it alike, and
 * a session as far as both were measured in it. First order, by numerical derivatives; Method 1, section 1.
 * @see JCGM 100:2008, 5.1.2
 */
export function differenceDoubt({ uncertainty }: Doubts, one: Measured, other: Measured, quantity: Quantity): number {
  const sessions = [...new Set([...Object.keys(one.sessions), ...Object.keys(other.sessions)])]
  const sizes = [
    ...[one.page.u, one.ink.u, other.page.u, other.ink.u, uncertainty.common].flatMap(channels),
    ...sessions.flatMap(() => channels(uncertainty.session)),
  ]

  function figure(device: Measured, errors: number[], own: number): number {
    const shared = CHANNELS.map((_, channel) =>
      sessions.reduce(
        (sum, id, place) => sum + (device.sessions[id] ?? 0) * errors[15 + 3 * place + channel]!,
        errors[12 + channel]!,
      ),
    )
    const shifted = (state: Lab, from: number) => ({
      L: state.L + errors[from]! + shared[0]!,
      a: state.a + errors[from + 1]! + shared[1]!,
      b: state.b + errors[from + 2]! + shared[2]!,
    })
    return quantity({ page: shifted(device.page, own), ink: shifted(device.ink, own + 3) })
  }

  const difference = (errors: number[]) => figure(one, errors, 0) - figure(other, errors, 6)
  return COVERAGE_FACTOR * propagate(difference, Array(sizes.length).fill(0), sizes)
}

const channels = (lab: Lab) => CHANNELS.map((channel) => lab[channel])

/** Whether two devices' figures differ by no more than the doubt of their difference. */
export function withinDoubt(doubts: Doubts, one: Measured, other: Measured, quantity: Quantity): boolean {
  return Math.abs(quantity(one) - quantity(other)) <= differenceDoubt(doubts, one, other, quantity)
}
