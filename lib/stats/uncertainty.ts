import { sum } from './describe'

/** Coverage factor of every published expanded uncertainty: about 95 % (JCGM 100:2008, 6.3.3). */
export const COVERAGE_FACTOR = 2

/**
 * Expanded uncertainty k·√Σuᵢ² of independent standard uncertainties in one unit, each already multiplied by its
 * sensitivity. The factor is fixed, not taken from effective degrees of freedom.
 * @param components at least one, each ≥ 0
 * @see JCGM 100:2008, 5.1.2 and 6.2.1
 */
export function expandedUncertainty(components: readonly number[], k = COVERAGE_FACTOR): number {
  if (components.length === 0) throw new RangeError('an uncertainty needs at least one component, got none')
  requireUncertainties(components)
  return k * Math.hypot(...components)
}

/** A step of a thousandth of u follows the slope, not the chord; the floor keeps the difference clear of rounding (house). */
const STEP_OF_UNCERTAINTY = 1e-3
const STEP_OF_VALUE = 1e-6

/**
 * Standard uncertainty of f(values), first order, √Σ(∂f/∂xᵢ·uᵢ)², the slopes by central differences. Inputs are
 * independent: an error that two of them share must be an input of its own.
 * @param f the measurement model; must be finite at the values and a step (u/1000, or a millionth of the value where
 *   that is more) to either side
 * @param uncertainties standard uncertainties, each ≥ 0 and in the unit of its value; an exact value has 0
 * @throws RangeError when the lists do not match or f is not finite there
 * @see JCGM 100:2008, 5.1.2
 */
export function propagate(
  f: (values: number[]) => number,
  values: readonly number[],
  uncertainties: readonly number[],
): number {
  if (values.length !== uncertainties.length) {
    throw new RangeError(`${values.length} values need as many uncertainties, got ${uncertainties.length}`)
  }
  requireUncertainties(uncertainties)
  const parts = values.map((value, i) => {
    const u = uncertainties[i]!
    if (u === 0) return 0
    const step = Math.max(u * STEP_OF_UNCERTAINTY, Math.abs(value) * STEP_OF_VALUE)
    const [high, low] = [value + step, value - step]
    return ((f(values.with(i, high)) - f(values.with(i, low))) / (high - low)) * u
  })
  const combined = Math.sqrt(sum(parts.map((part) => part ** 2)))
  if (!Number.isFinite(combined)) throw new RangeError('f must be finite within a step of the values')
  return combined
}

function requireUncertainties(uncertainties: readonly number[]): void {
  for (const u of uncertainties) {
    if (!(u >= 0 && u < Infinity)) throw new RangeError(`a standard uncertainty must be finite and ≥ 0, got ${u}`)
  }
}
