import Color from 'colorjs.io'
import adapt from 'colorjs.io/src/adapt.js'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { cat16 } from '@/lib/colour/adaptation'
import { deltaE00 } from '@/lib/colour/difference'
import { labToHex } from '@/lib/colour/display'
import { type Lab, labToXyz, xyzToLab } from '@/lib/colour/lab'
import { WEIGHTS } from '@/lib/colour/weights'
import { D65_10, type Xyz } from '@/lib/colour/white'

// Source of every expected value here: colorjs.io, an independent colour library. The colours are 1,000 at random from
// a fixed seed, over the whole range rather than pages alone.
const colours: Lab[] = fc.sample(
  fc.record({
    L: fc.double({ min: 0, max: 100, noNaN: true }),
    a: fc.double({ min: -100, max: 100, noNaN: true }),
    b: fc.double({ min: -100, max: 100, noNaN: true }),
  }),
  { numRuns: 1000, seed: 1964 },
)

type Triple = [number, number, number]
const white10: Triple = [D65_10.X / 100, D65_10.Y / 100, D65_10.Z / 100]
// Its D65 is the 2° one. CIELAB knows only ratios to the white, so ours is passed by scaling each value from it to ours.
const white2 = Color.WHITES.D65 as Triple
const toTenDegree = (value: number, index: number) => ((value * white10[index]!) / white2[index]!) * 100
const fromTenDegree = ({ X, Y, Z }: Xyz) =>
  [X, Y, Z].map((value, index) => ((value / 100) * white2[index]!) / white10[index]!) as Triple

test('L*a*b* to XYZ and back agree with a second library', () => {
  for (const lab of colours) {
    const theirs = new Color('lab-d65', [lab.L, lab.a, lab.b]).to('xyz-d65').coords.map((c, i) => toTenDegree(c!, i))
    const ours = labToXyz(lab)
    expect(ours.X).toBeCloseTo(theirs[0]!, 9)
    expect(ours.Y).toBeCloseTo(theirs[1]!, 9)
    expect(ours.Z).toBeCloseTo(theirs[2]!, 9)

    const [L, a, b] = new Color('xyz-d65', fromTenDegree(ours)).to('lab-d65').coords
    const back = xyzToLab(ours)
    expect(back.L).toBeCloseTo(L!, 9)
    expect(back.a).toBeCloseTo(a!, 9)
    expect(back.b).toBeCloseTo(b!, 9)
  }
})

test('ΔE00 agrees with a second library', () => {
  for (const [index, one] of colours.entries()) {
    const other = colours[(index + 1) % colours.length]!
    const near = { L: one.L, a: one.a + 0.7, b: one.b - 1.1 }
    for (const second of [other, near]) {
      const theirs = new Color('lab', [one.L, one.a, one.b]).deltaE2000(
        new Color('lab', [second.L, second.a, second.b]),
      )
      // The rotation term cancels large parts; ten good digits of fifteen are left.
      expect(deltaE00(one, second)).toBeCloseTo(theirs, 7)
    }
  }
})

test('chromatic adaptation agrees with a second library for every light', () => {
  for (const { white } of Object.values(WEIGHTS)) {
    const from: Triple = [white.X / 100, white.Y / 100, white.Z / 100]
    for (const lab of colours) {
      const xyz = labToXyz(lab, white)
      const theirs = adapt(from, white10, [xyz.X, xyz.Y, xyz.Z], { method: 'CAT16' })
      const ours = cat16(xyz, white, D65_10)
      expect(ours.X).toBeCloseTo(theirs[0], 9)
      expect(ours.Y).toBeCloseTo(theirs[1], 9)
      expect(ours.Z).toBeCloseTo(theirs[2], 9)
    }
  }
})

const hex = (color: Color) => color.to('srgb').toGamut({ method: 'clip' }).toString({ format: 'hex', collapse: false })

test('a neutral is drawn as the neutral grey a second library gives its lightness', () => {
  for (const { L } of colours) {
    const drawn = labToHex({ L, a: 0, b: 0 })
    expect(drawn).toBe(hex(new Color('lab-d65', [L, 0, 0])))
    expect(drawn).toMatch(/^#(..)\1\1$/)
  }
})

test('a colour is drawn as a second library draws it after the same adaptation', () => {
  for (const lab of colours) {
    const { X, Y, Z } = labToXyz(lab)
    const adapted = adapt(white10, white2, [X / 100, Y / 100, Z / 100], { method: 'CAT16' })
    expect(labToHex(lab)).toBe(hex(new Color('xyz-d65', adapted)))
  }
})
