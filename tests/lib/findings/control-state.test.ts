import { describe, expect, test } from 'vitest'
import { type ControlReading, controlStates } from '@/lib/findings/control-state'
import reference from '@/tests/reference/control-chart.json'

const day = (n: number) => new Date(Date.UTC(2026, 0, n))
const read = (n: number, L: number, fields: Partial<ControlReading> = {}): ControlReading => ({
  session: `session ${n}`,
  startedAt: day(n),
  instrumentId: 1,
  sampleId: 1,
  moment: 'start',
  L,
  a: 0,
  b: 0,
  ...fields,
})

// NIST/SEMATECH e-Handbook 6.3.2.2, ten flow-rate batches (control-chart.json); it rounds d2 to 1.128.
const { input, expected, tolerance } = reference.cases.find(({ id }) => id === 'individuals-nist-flow') as unknown as {
  input: { data: number[] }
  expected: { xbar: number; ucl: number }
  tolerance: { limit: number }
}

describe('the control tile of a session', () => {
  test('is judged on an individuals chart of session means, three sigma by the moving range', () => {
    const states = controlStates(input.data.map((value, i) => read(i + 1, value)))
    expect(states.map(({ session }) => session)).toEqual(input.data.map((_, i) => `session ${i + 1}`))
    states.forEach(({ offset, reach, inLimits }, i) => {
      expect(offset.L).toBeCloseTo(input.data[i]! - expected.xbar, 10)
      expect(Math.abs(reach!.L - (expected.ucl - expected.xbar))).toBeLessThan(2 * tolerance.limit)
      expect(inLimits).toBe(true)
    })
  })

  test('is outside where any one channel is', () => {
    const quiet = Array.from({ length: 12 }, (_, i) => read(i + 1, 95 + (i % 2) * 0.02))
    const states = controlStates([...quiet, read(13, 95.01, { b: 0.4 })])
    expect(states.map(({ inLimits }) => inLimits)).toEqual([...quiet.map(() => true), false])
    expect(states.at(-1)?.offset.L).toBeCloseTo(0, 2)
  })

  test('counts once a session, however many readings it has, and tells how it moved from start to end', () => {
    const states = controlStates([
      read(1, 95.0),
      read(1, 95.2),
      read(1, 95.4, { moment: 'end' }),
      read(2, 95.2),
      read(2, 95.2, { moment: 'end' }),
    ])
    expect(states[0]).toMatchObject({ readings: 3 })
    expect(states[0]?.drift).toBeCloseTo(0.3, 10)
    expect(states[1]?.drift).toBe(0)
    expect(states[0]?.offset.L).toBeCloseTo(0, 10)
  })

  test('is compared with sessions of the same tile on the same instrument only', () => {
    const states = controlStates([
      read(1, 95),
      read(2, 90, { instrumentId: 2 }),
      read(3, 95.1),
      read(4, 90.1, { instrumentId: 2 }),
      read(5, 80, { sampleId: 2 }),
    ])
    expect(states.map(({ offset }) => Math.round(offset.L * 100))).toEqual([-5, -5, 5, 5, 0])
  })

  test('has no limits while its chart has one session, and no drift where it was not read twice', () => {
    expect(controlStates([read(1, 95)])).toMatchObject([{ reach: null, inLimits: null, drift: null }])
    expect(controlStates([])).toEqual([])
  })
})
