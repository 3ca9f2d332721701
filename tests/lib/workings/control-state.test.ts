import { describe, expect, test } from 'vitest'
import { controlOfRanges, controlOfValues, RULE_WORDS } from '@/lib/workings/control-state'
import { controlWords, sinceWords } from '@/lib/workings/control-words'
import reference from '@/tests/reference/control-chart.json'

// biome-ignore lint/suspicious/noExplicitAny: a reference file of many shapes
const find = (id: string): any => reference.cases.find((entry) => entry.id === id)

const sessions = (count: number) =>
  Array.from({ length: count }, (_, i) => ({
    name: `session-${i + 1}`,
    startedAt: new Date(Date.UTC(2026, 0, i + 1)),
  }))

// NIST/SEMATECH e-Handbook 6.3.2.2, flow-rate batches (control-chart.json).
test('the handbook’s flow rates are judged by its limits and found in control', () => {
  const { input, expected } = find('individuals-nist-flow')
  const state = controlOfValues(input.data)!
  expect(state.limits.centre).toBeCloseTo(expected.xbar, 9)
  expect(Math.abs(state.limits.upper - expected.ucl)).toBeLessThan(0.002)
  expect(Math.abs(state.limits.lower - expected.lcl)).toBeLessThan(0.002)
  expect(state.points.filter(({ outside }) => outside)).toHaveLength(expected.outOfControl.length)
})

// Montgomery 1991, piston rings (control-chart.json): D3·R̄ to D4·R̄.
test('the ranges of the piston rings have the book’s limits, and none is outside', () => {
  const { input, expected } = find('xbar-r-piston-rings')
  const state = controlOfRanges(input.subgroups)!
  expect(state.limits.centre).toBeCloseTo(expected.rbar, 9)
  expect(Math.abs(state.limits.upper - expected.range.ucl)).toBeLessThan(2e-5)
  expect(state.points.filter(({ outside }) => outside)).toHaveLength(expected.outOfControlRange.length)
  expect(state).toMatchObject({ since: 0, runs: false })
})

// Nelson 1984; wording as in control-chart.json.
test('each of Nelson’s rules has words', () => {
  expect(Object.keys(RULE_WORDS)).toEqual(Object.keys(reference.runRules.nelson.rules))
})

describe('what a chart is said to show', () => {
  test('a steady series has been in control all along', () => {
    const steady = controlOfValues([1, 2, 1.5, 1.2, 1.9, 1.4])!
    expect(controlWords(steady, sessions(6))).toBe(
      'All 6 sessions are within the limits. No run stands out. It has been in control all along.',
    )
    expect(sinceWords(steady, sessions(6))).toBe('all along')
  })

  // By hand: moving ranges of thirteen values about 10 are 0.1, of the one jump 5: the jump is far outside ±3·M̄R/1.128.
  test('a session outside is named with its day, and control counts from the next', () => {
    const values = [10, 10.1, 10, 10.1, 10, 10.1, 15, 10, 10.1, 10, 10.1, 10, 10.1, 10]
    const state = controlOfValues(values)!
    expect(state.points[6]).toMatchObject({ outside: true })
    expect(state.points[6]?.rules).toContain(1)
    const words = controlWords(state, sessions(14))
    expect(words).toContain('Outside the limits: session-7 (7 January 2026).')
  })

  test('a run that reaches the last session leaves the series out of control', () => {
    const values = [0, 1, 0, 1, 0, 1, 2, 3, 4, 5, 6, 7]
    const state = controlOfValues(values)!
    expect(state.since).toBeNull()
    expect(sinceWords(state, sessions(12))).toBe('not in control at its last session')
    expect(controlWords(state, sessions(12))).toContain('it is not in control')
    expect(controlWords(state, sessions(12))).toContain(RULE_WORDS[3])
  })
})

test('too little, or nothing that varies, is not judged', () => {
  expect(controlOfValues([])).toBeNull()
  expect(controlOfValues([70])).toBeNull()
  expect(controlOfValues([70, 70, 70])).toBeNull()
  expect(controlOfRanges([])).toBeNull()
  expect(
    controlOfRanges([
      [1, 2],
      [1, 2, 3],
    ]),
  ).toBeNull()
})
