import { mean, squaresAboutMean, sum } from './describe'

/** Why a component has no value. */
export type NoComponent =
  /** Nothing at this level is repeated: no set of two readings, no unit of two sets, no model of two units. */
  | 'not-repeated'
  /** The level inside has no value, so its part cannot be taken out of this one. */
  | 'inner-unknown'

/** One number for each level: readings within sets, sets (positions) within units, units within models. */
type ByLevel<T> = { reading: T; position: T; unit: T }

export type NestedComponents = {
  /** Standard deviation of readings within a set; null: see `reason.reading`. */
  sReading: number | null
  /** Standard deviation of positions within a unit, the readings' own scatter taken out. */
  sPosition: number | null
  /** Standard deviation of units within a model, the scatter of readings and positions taken out. */
  sUnit: number | null
  /** The variances as estimated; one may be negative, and then its standard deviation above is 0. */
  variance: ByLevel<number | null>
  /** Degrees of freedom: readings − sets, sets − units, units − models. */
  df: ByLevel<number>
  reason: ByLevel<NoComponent | null>
  /** How many models have two units or more: all that is known of the spread between units comes from them. */
  modelsWithTwoUnits: number
}

/**
 * Nested random-effects components, pooled over models of any size: each mean square of the hierarchical analysis of
 * variance is set equal to its expectation, with the coefficients that unequal numbers of readings, sets and units
 * give. Every model keeps a mean of its own; how models differ is not estimated. Standard deviations are in the unit
 * of the readings. An outer component is solved from the inner variance as estimated, even a negative one (so it is
 * unbiased); only the standard deviations handed back are held at 0.
 * @param models model → unit → set → readings; empty groups count for nothing
 * @throws RangeError when a reading is not finite
 * @see Searle, Casella & McCulloch, Variance Components, 1992 (ANOVA estimation from unbalanced nested data), from
 *   memory; ISO 5725-2:1994, 7.4, is its one-level case
 */
export function nestedComponents(models: readonly (readonly (readonly (readonly number[])[])[])[]): NestedComponents {
  const present = gather(models.map((units) => gather(units.map((sets) => gather(sets.map(leaf)))))).parts
  const units = present.flatMap((model) => model.parts)
  const sets = units.flatMap((unit) => unit.parts)
  const readings = sum(present.map((model) => model.n))

  // Σ over sets of n², each divided by the n of its unit and of its model; and the same of units within models.
  const setsInUnits = sum(units.map(crowding))
  const setsInModels = sum(
    present.map((model) => sum(model.parts.flatMap((u) => u.parts.map(({ n }) => n * n))) / model.n),
  )
  const unitsInModels = sum(present.map(crowding))

  const df = {
    reading: readings - sets.length,
    position: sets.length - units.length,
    unit: units.length - present.length,
  }
  const reading = df.reading > 0 ? sum(sets.map((set) => set.squares)) / df.reading : null
  const position =
    df.position > 0 && reading !== null
      ? (sum(units.map((unit) => unit.squares)) - df.position * reading) / (readings - setsInUnits)
      : null
  const unit =
    df.unit > 0 && reading !== null && position !== null
      ? (sum(present.map((model) => model.squares)) - df.unit * reading - (setsInUnits - setsInModels) * position) /
        (readings - unitsInModels)
      : null

  return {
    sReading: rootOrZero(reading),
    sPosition: rootOrZero(position),
    sUnit: rootOrZero(unit),
    variance: { reading, position, unit },
    df,
    reason: {
      reading: whyNot(reading, df.reading),
      position: whyNot(position, df.position),
      unit: whyNot(unit, df.unit),
    },
    modelsWithTwoUnits: present.filter((model) => model.parts.length > 1).length,
  }
}

/** `n` readings, their mean, and the squares about it: of the parts' means, weighted by readings; in a set, of the readings. */
type Group<Part> = { n: number; mean: number; squares: number; parts: Part[] }

function leaf(readings: readonly number[]): Group<never> {
  if (readings.length === 0) return { n: 0, mean: 0, squares: 0, parts: [] }
  return { n: readings.length, mean: mean(readings), squares: squaresAboutMean(readings), parts: [] }
}

/** The parts that hold readings, as one group; without any its mean is never asked for. */
function gather<Part extends Group<unknown>>(all: Part[]): Group<Part> {
  const parts = all.filter((part) => part.n > 0)
  const n = sum(parts.map((part) => part.n))
  const centre = sum(parts.map((part) => part.n * part.mean)) / n
  return { n, mean: centre, squares: sum(parts.map((part) => part.n * (part.mean - centre) ** 2)), parts }
}

/** Σ nₚ²/n over the parts: 0 < crowding ≤ n, and n where one part holds everything. */
function crowding({ n, parts }: Group<Group<unknown>>): number {
  return sum(parts.map((part) => part.n ** 2)) / n
}

function rootOrZero(variance: number | null): number | null {
  return variance === null ? null : Math.sqrt(Math.max(variance, 0))
}

function whyNot(variance: number | null, degrees: number): NoComponent | null {
  if (variance !== null) return null
  return degrees > 0 ? 'inner-unknown' : 'not-repeated'
}
