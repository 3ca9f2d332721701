import { METHOD } from './constants'
import { clarityScore, tintScore, whitenessScore } from './criteria'
import { type Prepared, type PreparedSpot, surfaceOf } from './fit'
import { handlingScore } from './handling'
import { clamp } from './light'
import { byFit } from './order'
import { fluency, reserveIn, SPOT_READING } from './reserve'
import type { EditionDevice, WouldChange } from './types'
import { TOUCHING } from './weight-reversal'
import { type ByAim, finalWeights, lightMultipliers } from './weights'

/** A value in each spot, and its mean over the hours as they are. */
type BySpot = { inSpot: number[]; mean: number }

/** What a device brings to each spot, and its scores that no hour changes. */
type InSpots = { slug: string; gain: BySpot; unreadable: BySpot; whiteness: number; tint: number; handling: number }

/** Hours moved between two of the prepared spots. */
type Move = { from: number; to: number; hours: number }

/**
 * The fewest hours, in steps of one half, moved from one spot to another that put a device strictly ahead of the one
 * in first place. The aims' multipliers follow the hours. Of moves of the same hours the first counts: by the spot they
 * leave, then by the one they go to, in the request's order. No spot is given more than a week has.
 * @param devices in ranked order
 * @returns indexes into the request's spots; null where no move does it
 */
export function changeByHours(prepared: Prepared, devices: readonly EditionDevice[]): WouldChange['hours'] {
  const { spots } = prepared
  if (devices.length < 2 || spots.length < 2) return null
  const all = devices.map((device) => inSpots(device, prepared))
  const leader = all[0]!
  const rivals = undominated(all).slice(1)
  if (rivals.length === 0) return null

  const light = lightOf(prepared)
  const step = METHOD.changes.hourStep.value
  const most = Math.max(...spots.map((spot) => spot.hours))
  for (let hours = step; hours <= most; hours += step) {
    for (let from = 0; from < spots.length; from++) {
      if (spots[from]!.hours < hours) continue
      for (let to = 0; to < spots.length; to++) {
        if (to === from || spots[to]!.hours + hours > METHOD.light.mostHours.value) continue
        const fitOf = fitAfter(prepared, light, { from, to, hours })
        const toBeat = fitOf(leader) + TOUCHING
        if (!rivals.some((rival) => fitOf(rival) > toBeat)) continue
        const [first] = all.map((device) => ({ slug: device.slug, fit: fitOf(device) })).sort(byFit)
        return { from: spots[from]!.index, to: spots[to]!.index, hours, first: first!.slug }
      }
    }
  }
  return null
}

function inSpots(device: EditionDevice, { spots, eye, white, handling }: Prepared): InSpots {
  const surface = surfaceOf(device)
  const reserves = spots.map((spot) => reserveIn(surface, spot, eye))
  return {
    slug: device.slug,
    gain: bySpot(spots, (spot, s) => fluency(reserves[s]!) - spot.rhoDim),
    unreadable: bySpot(spots, (_, s) => (reserves[s]! < SPOT_READING ? 1 : 0)),
    whiteness: whitenessScore(device.page, white),
    tint: tintScore(device.page, white),
    handling: handlingScore(device, handling).score,
  }
}

/** The first, and every one that none before it equals or betters in all respects: the others can never be ahead. */
function undominated(all: readonly InSpots[]): InSpots[] {
  const kept: InSpots[] = []
  for (const device of all) if (!kept.some((better) => dominates(better, device))) kept.push(device)
  return kept
}

function dominates(one: InSpots, other: InSpots): boolean {
  return (
    one.whiteness >= other.whiteness &&
    one.tint >= other.tint &&
    one.handling >= other.handling &&
    one.gain.inSpot.every((gain, s) => gain >= other.gain.inSpot[s]!) &&
    one.unreadable.inSpot.every((unreadable, s) => unreadable <= other.unreadable.inSpot[s]!)
  )
}

function bySpot(spots: readonly PreparedSpot[], value: (spot: PreparedSpot, s: number) => number): BySpot {
  const inSpot = spots.map(value)
  return { inSpot, mean: inSpot.reduce((sum, one, s) => sum + spots[s]!.share * one, 0) }
}

/** What a reader's spots bring to the scale of clarity and to the weights. */
type Light = { span: BySpot; gain: BySpot; colourfulness: BySpot }

function lightOf({ spots }: Prepared): Light {
  return {
    span: bySpot(spots, (spot) => spot.rhoBright - spot.rhoDim),
    gain: bySpot(spots, (spot) => spot.pull.gain),
    colourfulness: bySpot(spots, (spot) => spot.pull.colourfulness),
  }
}

/** Fits after a move. All spots but two keep their hours, so each mean is the old one and one difference. */
function fitAfter(
  { spots, byHand, aims }: Prepared,
  light: Light,
  { from, to, hours }: Move,
): (device: InSpots) => number {
  const share = hours * (spots[from]!.share / spots[from]!.hours)
  const after = ({ inSpot, mean }: BySpot) => mean + share * (inSpot[to]! - inSpot[from]!)
  const span = after(light.span)
  const weights: ByAim = byHand
    ? aims
    : finalWeights(aims, lightMultipliers({ gain: after(light.gain), colourfulness: after(light.colourfulness) }))
  return ({ gain, unreadable, whiteness, tint, handling }) =>
    100 *
    (1 - clamp(after(unreadable))) *
    (weights.clarity * clarityScore(after(gain), span) +
      weights.whiteness * whiteness +
      weights.tint * tint +
      weights.handling * handling)
}
