import { formatNumber } from '@/lib/format/number'
import { cameraEstimate, type Estimate, lampEstimate, SIGHTS } from './estimate'
import { plainNumber } from './values'

/** What the helper takes: lumens of a bulb, centimetres from it to the page, exposure values at ISO 100. */
export const LUMEN_RANGE = { low: 1, high: 20_000 }
export const DISTANCE_RANGE = { low: 5, high: 1000 }
export const CAMERA_RANGE = { low: -4, high: 18 }

export const WAYS = ['see', 'lamp', 'camera'] as const
export type Way = (typeof WAYS)[number]

export type EstimateOutcome = { way: Way | null; estimate: Estimate | null; problem: string | null }

/** The outcome of the helper's forms as an address holds them; `way` is null where none was sent. */
export function readEstimate(search: { get: (name: string) => string | null }): EstimateOutcome {
  const way = WAYS.find((one) => one === search.get('way')) ?? null
  if (way === null) return { way, estimate: null, problem: null }
  const numberIn = (name: string, { low, high }: { low: number; high: number }) => {
    const value = plainNumber(search.get(name) ?? '')
    return value !== undefined && value >= low && value <= high ? value : null
  }

  if (way === 'see') {
    const sight = SIGHTS.find((_, i) => String(i + 1) === search.get('see'))
    return sight
      ? { way, estimate: { lux: sight.lux, low: sight.low, high: sight.high }, problem: null }
      : { way, estimate: null, problem: 'Choose what comes nearest to what you can see there.' }
  }
  if (way === 'camera') {
    const exposureValue = numberIn('ev', CAMERA_RANGE)
    const problem = `The exposure value must be a number ${span(CAMERA_RANGE)}.`
    return exposureValue === null
      ? { way, estimate: null, problem }
      : { way, estimate: cameraEstimate(exposureValue), problem: null }
  }
  const typed = search.get('lumens')?.trim() ? 'lumens' : 'lamp'
  const lumens = numberIn(typed, LUMEN_RANGE)
  const distance = numberIn('distance', DISTANCE_RANGE)
  if (lumens === null) {
    return {
      way,
      estimate: null,
      problem: `The lumens must be a number ${span(LUMEN_RANGE)}.`,
    }
  }
  if (distance === null) {
    return { way, estimate: null, problem: `The distance must be a number of centimetres ${span(DISTANCE_RANGE)}.` }
  }
  return { way, estimate: lampEstimate(lumens, distance / 100), problem: null }
}

function span({ low, high }: { low: number; high: number }): string {
  return `from ${formatNumber(low)} to ${formatNumber(high)}`
}
