import type { Doubts, Measured } from '@/lib/findings/difference'
import { COVERAGE_FACTOR, propagate } from '@/lib/stats/uncertainty'

/** A figure made of the lightness of a page and its ink, L* 0–100; it may be asked a little outside. */
export type OfLightness = (pageL: number, inkL: number) => number

/** A device and the figure in question; each device has its own, since a front light is part of it. */
export type Figured = { device: Measured; figure: OfLightness }

/** Errors in order: page and ink of each device, the common one, each session's. */
const OWN = 2

/**
 * Expanded uncertainty (k = 2) of the difference of a figure between devices, or of one device's figure where it is
 * alone. As `differenceDoubt`, but a figure for each device: the errors they share are one input each, so that what is
 * common drops out. Session and common errors move page and ink alike. First order; Method 1, section 1.
 * @see JCGM 100:2008, 5.1.2
 */
export function lightnessDoubt({ uncertainty }: Doubts, one: Figured, other?: Figured): number {
  const both = other ? [one, other] : [one]
  const sessions = [...new Set(both.flatMap(({ device }) => Object.keys(device.sessions)))]
  const common = OWN * both.length
  const sizes = [
    ...both.flatMap(({ device }) => [device.page.u.L, device.ink.u.L]),
    uncertainty.common.L,
    ...sessions.map(() => uncertainty.session.L),
  ]
  function figureAt({ device, figure }: Figured, at: number, errors: readonly number[]): number {
    const shared = sessions.reduce(
      (sum, id, i) => sum + (device.sessions[id] ?? 0) * errors[common + 1 + i]!,
      errors[common]!,
    )
    return figure(device.page.L + errors[OWN * at]! + shared, device.ink.L + errors[OWN * at + 1]! + shared)
  }
  const difference = (errors: number[]) => figureAt(one, 0, errors) - (other ? figureAt(other, 1, errors) : 0)
  return COVERAGE_FACTOR * propagate(difference, Array(sizes.length).fill(0), sizes)
}
