import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { overlaps } from '@/components/charts/boxes'
import { layOutLadder, reserveAt } from '@/components/charts/ladder-layout'
import { layOutMap, POINT } from '@/components/charts/map-layout'
import { layOutStrips, type StripsLayout } from '@/components/charts/strips-layout'
import { LINE_PX, textWidth, wrapWords } from '@/components/charts/text-width'

const NAMES = ['Ostler Plain 7', 'Pellow Broadsheet 13 Colour', 'Corrin Duodecimo 6 Colour', 'Wexby Vesper 6']
const deviceNamed = (name: string, reserves: number[]) => ({ slug: name, name, reserves })
const SIZES = [
  { width: 600, gutter: 150 },
  { width: 272, gutter: 0 },
]

const reserve = fc.oneof(fc.constant(0), fc.double({ min: 0.4, max: 45, noNaN: true }))

describe('light strips', () => {
  const laid = fc
    .record({
      size: fc.constantFrom(...SIZES),
      reserves: fc.array(reserve, { minLength: 1, maxLength: 20 }),
      paper: fc.option(reserve),
    })
    .map(({ size, reserves, paper }) => ({
      size,
      layout: layOutStrips({
        ...size,
        spots: [{ name: 'In bed, small lamp at arm’s length', detail: '80 lux, 7 h a week, front light on' }],
        devices: reserves.map((value, i) => deviceNamed(`${NAMES[i] ?? 'Device'} ${i}`, [value])),
        paper: paper === null ? null : [paper],
        named: [`${NAMES[0]} 0`, `${NAMES[1]} 1`],
      }),
    }))

  test('names never touch one another and never leave the drawing', () => {
    fc.assert(
      fc.property(laid, ({ layout }) => {
        const boxes = boxesOf(layout)
        boxes.forEach((box, i) => {
          expect(box.x).toBeGreaterThanOrEqual(-0.01)
          expect(box.x + box.width).toBeLessThanOrEqual(layout.width + 0.01)
          for (const other of boxes.slice(i + 1)) expect(overlaps(box, other)).toBe(false)
        })
      }),
    )
  })

  test('names stay apart when the drawing is stretched to twice its least width', () => {
    fc.assert(
      fc.property(laid, ({ layout }) => {
        const boxes = boxesOf(layout, 2)
        boxes.forEach((box, i) => {
          for (const other of boxes.slice(i + 1)) expect(overlaps(box, other)).toBe(false)
        })
      }),
    )
  })

  test('the scale always holds every device, the paper and the three anchors', () => {
    fc.assert(
      fc.property(laid, ({ layout }) => {
        const { left, right } = layout.plot
        const marks = layout.strips.flatMap((strip) => [...strip.standing, ...strip.hanging])
        for (const { x } of [...marks, ...layout.ticks]) {
          expect(x).toBeGreaterThanOrEqual(left)
          expect(x).toBeLessThanOrEqual(right)
        }
      }),
    )
  })

  test('every strip ends above the next and inside the drawing', () => {
    const layout = layOutStrips({
      width: 272,
      gutter: 0,
      spots: Array.from({ length: 12 }, (_, i) => ({ name: `Spot ${i}`, detail: '80 lux' })),
      devices: NAMES.map((name, i) =>
        deviceNamed(
          name,
          Array.from({ length: 12 }, (_, spot) => spot * i),
        ),
      ),
      paper: null,
      named: NAMES.slice(0, 1),
    })
    layout.strips.forEach((strip, i) => {
      const lowest = Math.max(strip.axisY, strip.note?.y ?? 0, ...strip.hanging.map((mark) => mark.y + 11))
      expect(lowest).toBeLessThanOrEqual(layout.height)
      const next = layout.strips[i + 1]
      if (next)
        expect(lowest).toBeLessThan(
          Math.min(...next.heading.map((line) => line.y - 12), ...next.labels.map((l) => l.y - 12)),
        )
    })
  })

  test('where nothing can be read the strip says so in words', () => {
    const strip = (reserves: number[]) =>
      layOutStrips({
        width: 600,
        gutter: 150,
        spots: [{ name: 'In bed, lights off', detail: '0.1 lux' }],
        devices: reserves.map((value, i) => deviceNamed(`${i}`, [value])),
        paper: null,
        named: [],
      }).strips[0]?.note?.text
    expect(strip([0, 0, 12])).toBe('2 of 3 cannot be read here')
    expect(strip([0, 2.9])).toBe('none of the 2 can be read here')
    expect(strip([0])).toBe('cannot be read here')
    expect(strip([3, 30])).toBeUndefined()
  })

  function boxesOf(layout: StripsLayout, stretch = 1) {
    return layout.strips.flatMap((strip) =>
      strip.labels.map((label) => ({
        x: label.at * stretch + (label.x - label.at),
        y: label.y - LINE_PX + 4,
        width: textWidth(label.text),
        height: LINE_PX - 1,
      })),
    )
  }
})

describe('the white map', () => {
  const point = fc.record({
    a: fc.double({ min: -4, max: 2, noNaN: true }),
    b: fc.double({ min: -3, max: 6, noNaN: true }),
  })
  const laid = fc
    .record({ points: fc.array(point, { minLength: 1, maxLength: 17 }), width: fc.constantFrom(600, 272) })
    .map(({ points, width }) =>
      layOutMap({
        width,
        first: 'p0',
        namesUpTo: width === 272 ? 5 : Infinity,
        points: points.map(({ a, b }, i) => ({
          slug: `p${i}`,
          name: `Tamber Reed ${i} Colour`,
          a,
          b,
          ra: 0.3,
          rb: 0.4,
        })),
      }),
    )

  test('every page has words, by name or by number, that touch no other words', () => {
    fc.assert(
      fc.property(laid, (layout) => {
        const boxes = layout.points.map(({ x, y, label }) => ({
          x: x + label.dx,
          y: y + label.dy - 13,
          width: textWidth(label.text),
          height: 16,
        }))
        boxes.forEach((box, i) => {
          for (const other of boxes.slice(i + 1)) expect(overlaps(box, other)).toBe(false)
        })
        expect(layout.points.every((placed) => placed.label.text.length > 0)).toBe(true)
      }),
    )
  })

  test('one unit of a* is as long as one unit of b*', () => {
    fc.assert(
      fc.property(laid, ({ gridA, gridB }) => {
        const [a0, a1] = gridA
        const [b0, b1] = gridB
        if (!a0 || !a1 || !b0 || !b1) return
        expect((a1.x - a0.x) / (a1.at - a0.at)).toBeCloseTo((b0.y - b1.y) / (b1.at - b0.at), 6)
      }),
    )
  })

  test('every ellipse lies in the plot, and neutral white too', () => {
    fc.assert(
      fc.property(laid, ({ points, plot, gridA, gridB }) => {
        for (const { x, y, rx, ry } of points) {
          expect(x - rx).toBeGreaterThanOrEqual(plot.x)
          expect(x + rx).toBeLessThanOrEqual(plot.x + plot.width)
          expect(y - ry).toBeGreaterThanOrEqual(plot.y)
          expect(y + ry).toBeLessThanOrEqual(plot.y + plot.height)
        }
        expect(gridA.some(({ at }) => at === 0)).toBe(true)
        expect(gridB.some(({ at }) => at === 0)).toBe(true)
        expect(POINT.width).toBeLessThan(POINT.height)
      }),
    )
  })
})

describe('the ladder', () => {
  const curve = (name: string, factor: number) => ({
    name,
    style: 'first' as const,
    points: [1, 10, 100, 1000, 10_000, 100_000].map((lux, i) => ({ lux, reserve: factor * (6 + 6 * i) })),
  })

  test('a reserve between two points is read off the straight line through their logarithms', () => {
    const points = [
      { lux: 1, reserve: 0 },
      { lux: 10, reserve: 4 },
      { lux: 1000, reserve: 16 },
    ]
    expect(reserveAt(points, 10)).toBe(4)
    // Half-way between 10 and 1,000 is 100, and between 4 and 16 it is 8.
    expect(reserveAt(points, 100)).toBeCloseTo(8, 12)
    expect(reserveAt(points, 3)).toBeNull()
    expect(reserveAt(points, 0.5)).toBeNull()
    expect(reserveAt(points, 2000)).toBeNull()
  })

  test('names at the ends of curves never touch, however close the curves', () => {
    const { curves } = layOutLadder({
      width: 600,
      plotHeight: 250,
      gutter: 146,
      curves: [
        curve('Pellow Broadsheet 13 Colour', 1),
        curve('Corrin Duodecimo 6 Colour', 1),
        curve('Ostler Plain 7', 1.001),
      ],
      bands: [],
    })
    const spans = curves.flatMap(({ label }) =>
      label ? [{ from: label.y - 13, to: label.y - 13 + label.lines.length * LINE_PX }] : [],
    )
    expect(spans).toHaveLength(3)
    spans.sort((one, two) => one.from - two.from)
    spans.slice(1).forEach((span, i) => {
      expect(span.from).toBeGreaterThanOrEqual(spans[i]?.to ?? 0)
    })
  })

  test('bands whose words would touch stand on different levels', () => {
    const { bands } = layOutLadder({
      width: 272,
      plotHeight: 240,
      gutter: 0,
      curves: [],
      bands: [
        { label: 'Bedside lamp', hint: 'small', lo: 50, hi: 200, tone: 'lamp' },
        { label: 'Office desk', hint: '', lo: 320, hi: 500, tone: 'room' },
      ],
    })
    expect(bands[0]?.labelY).not.toBe(bands[1]?.labelY)
  })
})

test('words wrap to the width they get, a single long word alone', () => {
  expect(wrapWords('In bed, small lamp at arm’s length', 110)).toEqual(['In bed, small', 'lamp at arm’s', 'length'])
  expect(wrapWords('Unbreakableword', 20)).toEqual(['Unbreakableword'])
})
