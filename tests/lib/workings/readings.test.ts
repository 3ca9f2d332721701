import { expect, test } from 'vitest'
import { readingSteps } from '@/lib/workings/reading-steps'
import { describeReadings } from '@/lib/workings/readings'
import gum from '@/tests/reference/gum.json'
import outliers from '@/tests/reference/outliers.json'
import students from '@/tests/reference/student-t.json'

const asReadings = (values: readonly number[]) => values.map((L) => ({ L, a: -1, b: 2 }))

// JCGM 100:2008, 4.4.3 (gum.json): twenty readings of a thermometer.
test('mean, standard deviation and s/√n are those of the guide’s twenty readings', () => {
  const { input, expected } = gum.cases.find(({ id }) => id === 'gum-4.4.3-thermometer') as {
    input: { data: number[] }
    expected: { mean: number; s: number; u: number }
  }
  const { L } = describeReadings(asReadings(input.data))
  expect(L.n).toBe(20)
  expect(L.mean).toBeCloseTo(expected.mean, 9)
  expect(L.sd).toBeCloseTo(expected.s, 9)
  expect(L.standard).toBeCloseTo(expected.u, 9)
})

// NIST/SEMATECH e-Handbook and computed cases, outliers.json; two-sided at 0.05 as the method has it.
const cases = outliers.cases.filter(
  ({ kind, input }) => kind === 'grubbs' && input.alternative === 'two-sided' && input.alpha === 0.05,
)
test.each(cases.filter(({ input, expected }) => input.data.length >= 4 && expected.G !== null))(
  'Grubbs’ test of $id is the reference’s, and the step names the reading',
  ({ input, expected }) => {
    const readings = asReadings(input.data)
    const statistics = describeReadings(readings).L
    expect(statistics.grubbs.G).toBeCloseTo(expected.G!, 3)
    expect(statistics.grubbs.critical).toBeCloseTo(expected.critical!, 3)
    const step = readingSteps(readings, statistics).find(({ id }) => id === 'grubbs')!
    expect(step.result).toContain(
      expected.isOutlier ? `reading ${expected.suspectIndex! + 1} stands out` : 'no reading stands out',
    )
  },
)
test('the reference has such cases', () => {
  expect(cases.length).toBeGreaterThanOrEqual(3)
})

// Worked by hand: 70.0, 70.2, 70.4 have mean 70.2 and s 0.2; Student's t at 97.5 % with 2 degrees of freedom 4.302653
// (student-t.json holds the table it is checked against).
test('the steps put the readings into the formula', () => {
  expect(JSON.stringify(students)).toContain('4.30265')
  const readings = asReadings([70, 70.2, 70.4])
  const steps = readingSteps(readings, describeReadings(readings).L)
  const of = (id: string) => steps.find((step) => step.id === id)!
  expect(of('mean')).toMatchObject({ worked: 'mean = (70 + 70.2 + 70.4)/3', result: 'L* 70.200' })
  expect(of('spread')).toMatchObject({ worked: 's = √(0.08000/2)', result: 's 0.2000' })
  expect(of('half-width')).toMatchObject({
    worked: '4.303·0.2000/√3',
    result: `± ${((4.302653 * 0.2) / Math.sqrt(3)).toFixed(3)}`,
  })
  expect(of('grubbs').result).toContain('Fewer than four readings')
})

test('one reading has a mean and no spread, and equal readings no test', () => {
  const one = asReadings([70])
  expect(describeReadings(one).L).toMatchObject({ n: 1, mean: 70, sd: null, standard: null, halfWidth: null })
  expect(readingSteps(one, describeReadings(one).L).map(({ result }) => result)).toEqual([
    'L* 70.000',
    'One reading says nothing about spread',
  ])
  const same = asReadings([70, 70, 70, 70, 70])
  const steps = readingSteps(same, describeReadings(same).L)
  expect(steps.find(({ id }) => id === 'half-width')?.note).toContain('does not make them right')
  expect(steps.at(-1)?.result).toContain('All readings are the same')
})
