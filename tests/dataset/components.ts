import { average } from './arithmetic'

const total = (values: number[]) => values.reduce((sum, value) => sum + value, 0)
const squaresAbout = (values: number[], centre: number) => total(values.map((value) => (value - centre) ** 2))

/**
 * Nested random effects by the hierarchical analysis of variance, every mean square set equal to its expectation
 * (Searle, Casella & McCulloch 1992): readings in sets, sets in units, units in models. Variances as estimated.
 * @param models model → unit → set → readings
 */
export function variances(models: number[][][][]): { reading: number; position: number; unit: number } {
  const units = models.flat()
  const sets = units.flat()
  const n = sets.flat().length
  const unitMean = (unit: number[][]) => average(unit.flat())

  const withinSets = total(sets.map((set) => squaresAbout(set, average(set))))
  const reading = withinSets / (n - sets.length)

  const betweenSets = total(
    units.map((unit) => total(unit.map((set) => set.length * (average(set) - unitMean(unit)) ** 2))),
  )
  const setSquaresPerUnit = total(units.map((unit) => total(unit.map((set) => set.length ** 2)) / unit.flat().length))
  const position = (betweenSets - (sets.length - units.length) * reading) / (n - setSquaresPerUnit)

  if (units.length === models.length) return { reading, position, unit: 0 }
  const betweenUnits = total(
    models.map((model) =>
      total(model.map((unit) => unit.flat().length * (unitMean(unit) - average(model.flat(2))) ** 2)),
    ),
  )
  const setSquaresPerModel = total(
    models.map((model) => total(model.flat().map((set) => set.length ** 2)) / model.flat(2).length),
  )
  const unitSquaresPerModel = total(
    models.map((model) => total(model.map((unit) => unit.flat().length ** 2)) / model.flat(2).length),
  )
  const unit =
    (betweenUnits - (units.length - models.length) * reading - (setSquaresPerUnit - setSquaresPerModel) * position) /
    (n - unitSquaresPerModel)
  return { reading, position, unit }
}
