import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { overlaps } from '@/components/charts/boxes'
import { ControlChart } from '@/components/charts/control-chart'
import { layOutControl } from '@/components/charts/control-chart-layout'
import { LINE_PX, textWidth } from '@/components/charts/text-width'
import { controlOfRanges, controlOfValues } from '@/lib/workings/control-state'
import reference from '@/tests/reference/control-chart.json'

// biome-ignore lint/suspicious/noExplicitAny: a reference file of many shapes
const find = (id: string): any => reference.cases.find((entry) => entry.id === id)

const dated = (points: { value: number; outside: boolean; rules: number[] }[]) =>
  points.map((point, i) => ({
    ...point,
    label: `s-${i + 1}`,
    day: new Date(Date.UTC(2025, 8, 1 + 14 * i)).toISOString(),
  }))

// NIST/SEMATECH e-Handbook 6.3.2.2, flow-rate batches (control-chart.json).
const flow = controlOfValues(find('individuals-nist-flow').input.data)!
const points = dated(flow.points)
const options = { points, limits: flow.limits, decimals: 2, zones: true, plotHeight: 170 }
const wide = layOutControl({ ...options, width: 600, gutter: 150 })
const narrow = layOutControl({ ...options, width: 272, gutter: 52 })

describe.each([
  ['wide', wide],
  ['narrow', narrow],
])('the %s drawing', (_, layout) => {
  const { expected } = find('individuals-nist-flow')
  const line = (id: string) => layout.lines.find((one) => one.id === id)!

  test('draws centre and limits where the handbook has them', () => {
    // A scale is linear: two lines fix it, and every point must lie where its value says.
    const perUnit = (line('lower').y - line('upper').y) / (expected.ucl - expected.lcl)
    expect(Math.abs(line('centre').y - (line('upper').y + (expected.ucl - expected.xbar) * perUnit))).toBeLessThan(0.1)
    for (const { point, y } of layout.points) {
      expect(Math.abs(y - (line('upper').y + (expected.ucl - point.value) * perUnit))).toBeLessThan(0.1)
    }
    expect(line('upper').words).toBe(`upper limit ${expected.ucl.toFixed(2)}`)
  })

  test('keeps every point inside the plot, oldest first and evenly spaced', () => {
    const { left, right, top, bottom } = layout.plot
    const steps = layout.points.slice(1).map(({ x }, i) => x - layout.points[i]!.x)
    for (const step of steps) expect(step).toBeCloseTo(steps[0]!, 6)
    for (const { x, y } of layout.points) {
      expect(x).toBeGreaterThanOrEqual(left)
      expect(x).toBeLessThanOrEqual(right)
      expect(y).toBeGreaterThanOrEqual(top)
      expect(y).toBeLessThanOrEqual(bottom)
    }
  })

  test('lets no two words under it touch, nor leave the drawing', () => {
    const boxes = layout.months.map(({ text, x, anchor }) => {
      const width = textWidth(text)
      return { x: anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2, y: 0, width, height: LINE_PX }
    })
    boxes.forEach((box, i) => {
      expect(box.x).toBeGreaterThanOrEqual(0)
      expect(box.x + box.width).toBeLessThanOrEqual(layout.width)
      for (const other of boxes.slice(i + 1)) expect(overlaps(box, other, 4)).toBe(false)
    })
  })

  test('names its lines, and leaves room for what stands beside them', () => {
    for (const { beside, words } of layout.lines) {
      expect(words).toContain(beside)
      expect(layout.plot.right + 8 + textWidth(beside)).toBeLessThanOrEqual(layout.width)
    }
  })

  test('has the zones at one and two sigma either side', () => {
    const sigma = (line('lower').y - line('upper').y) / 6
    expect(layout.zones.map((y) => Math.round((line('centre').y - y) / sigma))).toEqual([-2, -1, 1, 2])
  })
})

describe('a point out of control', () => {
  const far = controlOfValues([10, 10.1, 10, 10.1, 10, 10.1, 15, 10, 10.1, 10, 10.1, 10, 10.1, 10])!
  const layout = layOutControl({ ...options, points: dated(far.points), limits: far.limits, width: 600, gutter: 150 })

  test('has a shape of its own', () => {
    expect(layout.points[6]?.shape).toBe('diamond')
    expect(layout.points[5]?.shape).toBe('circle')
  })

  test('is said in words at the point, in the key and in the table', () => {
    const html = renderToStaticMarkup(
      <ControlChart title="Tile" quantity="L*" decimals={2} points={dated(far.points)} limits={far.limits} />,
    )
    expect(html).toContain('aria-label="L*: 15.00 on 24 November 2025, session s-7, outside a limit')
    expect(html.match(/outside a limit/g)!.length).toBeGreaterThanOrEqual(3)
    expect(html).toContain('The same figures as a table')
  })
})

test('each drawing has a title, a description, and every point within reach of the keyboard', () => {
  const html = renderToStaticMarkup(
    <ControlChart title="Flow of the batches" quantity="Flow" decimals={2} points={points} limits={flow.limits} />,
  )
  expect(html.match(/<title id="[^"]+">Flow of the batches<\/title>/g)).toHaveLength(2)
  expect(html.match(/data-mark[^>]*tabindex="0"/g)).toHaveLength(2 * points.length)
  expect(html).toContain(`${points.length} sessions, oldest first`)
})

// Montgomery 1991, piston rings (control-chart.json).
test('a chart of ranges has limits and no zones', () => {
  const ranges = controlOfRanges(find('xbar-r-piston-rings').input.subgroups)!
  const layout = layOutControl({
    ...options,
    points: dated(ranges.points),
    limits: ranges.limits,
    decimals: 3,
    zones: false,
    width: 600,
    gutter: 150,
  })
  expect(layout.zones).toEqual([])
  expect(layout.lines.map(({ words }) => words)).toEqual(['upper limit 0.048', 'centre 0.023', 'lower limit 0.000'])
})

test('without sessions there is nothing to draw, and it says so', () => {
  const html = renderToStaticMarkup(
    <ControlChart title="Tile" quantity="L*" decimals={2} points={[]} limits={flow.limits} />,
  )
  expect(html).toContain('There is no session to draw yet.')
})
