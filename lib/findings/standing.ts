import { type Doubts, type Measured, type Quantity, withinDoubt } from './difference'

/** Where a device stands by one figure: its place, and the places the doubt allows, all counted from 1. */
export type Standing = { place: number; best: number; worst: number; of: number }

/**
 * The place of a device among all by one figure, largest first, and the band it may truly hold: before it stand at
 * least those that are larger by more than the doubt of the difference, after it those that are smaller by more.
 */
export function standingBy<Device extends Measured>(
  edition: Doubts & { devices: readonly Device[] },
  device: Device,
  quantity: Quantity,
): Standing {
  const own = quantity(device)
  const others = edition.devices.filter((other) => other.slug !== device.slug)
  const clear = others.filter((other) => !withinDoubt(edition, other, device, quantity))
  return {
    place: 1 + others.filter((other) => quantity(other) > own).length,
    best: 1 + clear.filter((other) => quantity(other) > own).length,
    worst: 1 + others.length - clear.filter((other) => quantity(other) < own).length,
    of: edition.devices.length,
  }
}

/** The device with the largest figure and those too close to it to call; null in an edition without devices. */
export function leaderBy<Device extends Measured>(
  edition: Doubts & { devices: readonly Device[] },
  quantity: Quantity,
): { first: Device; tied: Device[] } | null {
  const [first, ...others] = [...edition.devices].sort(
    (one, other) => quantity(other) - quantity(one) || (one.slug < other.slug ? -1 : 1),
  )
  if (!first) return null
  return { first, tied: others.filter((other) => withinDoubt(edition, first, other, quantity)) }
}
