import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { afterEach, describe, expect, test } from 'vitest'
import { load } from '@/scripts/lib/load.mjs'
import { median } from '@/scripts/lib/median.mjs'
import { table, verdict } from '@/scripts/lib/verdicts.mjs'
import { cumulativeShift } from '@/scripts/lib/vitals.mjs'

let server: Server | undefined
afterEach(() => new Promise<void>((resolve) => (server ? server.close(() => resolve()) : resolve())))

test('the median is the middle, or the mean of the two in the middle', () => {
  expect(median([9, 1, 5])).toBe(5)
  expect(median([4, 1, 3, 2])).toBe(2.5)
  expect(median([])).toBeNaN()
})

describe('the cumulative shift', () => {
  // web.dev, "Cumulative Layout Shift": session windows of at most five seconds, gaps under one second.
  test('is the largest sum of one window, not of all', () => {
    const at = (...moments: number[]) => moments.map((startTime) => ({ value: 0.1, startTime }))
    expect(cumulativeShift([])).toBe(0)
    expect(cumulativeShift(at(0, 500, 900))).toBeCloseTo(0.3)
    expect(cumulativeShift(at(0, 500, 1500, 2000, 2400))).toBeCloseTo(0.3)
    expect(cumulativeShift(at(0, 900, 1800, 2700, 3600, 4500, 5400))).toBeCloseTo(0.6)
  })
})

describe('a verdict', () => {
  test('is met at its target and missed beyond it, and a figure that is none is missed', () => {
    expect(verdict('a', 1.5, { most: 1.5 }).met).toBe(true)
    expect(verdict('a', 1.51, { most: 1.5 }).met).toBe(false)
    expect(verdict('a', 0.8, { least: 0.8 }).met).toBe(true)
    expect(verdict('a', 0.79, { least: 0.8 }).met).toBe(false)
    expect(verdict('a', Number.NaN, { most: 1.5 }).met).toBe(false)
  })

  test('stands in a table with its figure and its target', () => {
    const text = table([
      verdict('home: CLS', 0.001, { most: 0.02 }, '', 3),
      verdict('home: scripts', 50, { most: 45 }, 'kB'),
    ])
    expect(text.split('\n').map((line: string) => line.trim().split(/ {2,}/))).toEqual([
      ['measured', 'target'],
      ['home: CLS', '0.001', '≤ 0.020', 'met'],
      ['home: scripts', '50 kB', '≤ 45 kB', 'MISSED'],
    ])
  })
})

test('the load counts what is answered and what is not, over connections that are kept', async () => {
  let answers = 0
  let connections = 0
  server = createServer((_, answer) => {
    answers += 1
    answer.statusCode = answers % 10 === 0 ? 500 : 200
    answer.end('x')
  })
  server.on('connection', () => {
    connections += 1
  })
  await new Promise<void>((resolve) => server!.listen(0, '127.0.0.1', resolve))
  const { port } = server.address() as AddressInfo
  const { perSecond, failures } = await load(`http://127.0.0.1:${port}/`, { seconds: 0.3, connections: 4 })
  expect(connections).toBe(4)
  expect(failures).toBe(Math.floor(answers / 10))
  expect(perSecond).toBeGreaterThan(10)
  expect(perSecond).toBeLessThanOrEqual((answers - failures) / 0.3)
})
