import Color from 'colorjs.io'
import adapt from 'colorjs.io/src/adapt.js'
import { describe, expect, test } from 'vitest'
import { underLamp } from '@/lib/colour/under-lamp'
import { type Light, WEIGHTS } from '@/lib/colour/weights'
import { D65_10, type Xyz } from '@/lib/colour/white'
import cam16 from '../../reference/cam16.json'
import reference from '../../reference/spectra.json'

type Triple = [number, number, number]
const triple = ({ X, Y, Z }: Xyz): Triple => [X / 100, Y / 100, Z / 100]
const white2 = Color.WHITES.D65 as Triple

/** CIELAB by colorjs.io: it knows ratios to its own white alone, so the colour is scaled from the lamp's white to that. */
function theirLab(xyz: Xyz, white: Xyz): number[] {
  const ratios = triple(xyz).map((value, i) => (value / triple(white)[i]!) * white2[i]!) as Triple
  return new Color('xyz-d65', ratios).to('lab-d65').coords as number[]
}

// tests/reference/spectra.json: 13 spectra under A, LED-B1, LED-B3 and FL11, ASTM E2022 weights, CAT16 back to D65.
describe.each(reference.spectra)('$id, $name', ({ R, otherLights }) => {
  test.each(Object.entries(otherLights))(
    'under %s has the reference’s XYZ, and its colour in daylight',
    (name, light) => {
      const { xyz, inDaylight } = underLamp(R, WEIGHTS[name as Light])
      for (const [i, value] of [xyz.X, xyz.Y, xyz.Z].entries()) expect(value).toBeCloseTo(light.XYZ[i]!, 5)
      // The file adapts to the white 94.81091, 100, 107.30476, we to the published 94.811, 100, 107.304.
      for (const [i, value] of [inDaylight.L, inDaylight.a, inDaylight.b].entries()) {
        expect(Math.abs(value - light.Lab[i]!)).toBeLessThan(2e-3)
      }
    },
  )

  // colorjs.io, an independent colour library: CIELAB, and adaptation by its own CAT16.
  test.each(Object.keys(WEIGHTS) as Light[])('under %s agrees with a second library', (name) => {
    const { white } = WEIGHTS[name]
    const { xyz, x, y, lab, inDaylight } = underLamp(R, WEIGHTS[name])
    const own = theirLab(xyz, white)
    const adapted = adapt(triple(white), triple(D65_10), triple(xyz), { method: 'CAT16' })
    const there = theirLab({ X: 100 * adapted[0], Y: 100 * adapted[1], Z: 100 * adapted[2] }, D65_10)
    for (const [i, value] of [lab.L, lab.a, lab.b].entries()) expect(value).toBeCloseTo(own[i]!, 8)
    for (const [i, value] of [inDaylight.L, inDaylight.a, inDaylight.b].entries()) {
      expect(value).toBeCloseTo(there[i]!, 8)
    }
    const [theirX, theirY] = new Color('xyz-d65', triple(xyz)).xy as unknown as [number, number]
    expect(x).toBeCloseTo(theirX, 12)
    expect(y).toBeCloseTo(theirY, 12)
  })
})

// Li et al. 2017; tests/reference/cam16.json gives the matrix. Von Kries: each response is scaled by the ratio of whites.
test('the adaptation scales the responses of the CAT16 matrix by those of the whites', () => {
  const { matrix } = cam16.model
  const responses = (xyz: Xyz) => matrix.map((row) => row[0]! * xyz.X + row[1]! * xyz.Y + row[2]! * xyz.Z)
  const R = reference.spectra.find(({ name }) => /page|grey/i.test(name))!.R
  const { xyz, inDaylight } = underLamp(R, WEIGHTS.A)
  const cube = (t: number) => (t > 6 / 29 ? t ** 3 : (108 / 841) * (t - 4 / 29))
  const f = (inDaylight.L + 16) / 116
  const back = {
    X: D65_10.X * cube(f + inDaylight.a / 500),
    Y: 100 * cube(f),
    Z: D65_10.Z * cube(f - inDaylight.b / 200),
  }
  const [under, there, lamp, day] = [xyz, back, WEIGHTS.A.white, D65_10].map((each) => responses(each)) as number[][]
  for (const i of [0, 1, 2]) expect(there![i]! / day![i]!).toBeCloseTo(under![i]! / lamp![i]!, 10)
})

test('a level spectrum is neutral under every lamp and in daylight after it', () => {
  for (const lamp of Object.values(WEIGHTS)) {
    const { lab, inDaylight } = underLamp(Array(31).fill(0.4), lamp)
    for (const value of [lab.a, lab.b, inDaylight.a, inDaylight.b]) expect(value).toBeCloseTo(0, 9)
    expect(lab.L).toBeCloseTo(inDaylight.L, 9)
  }
})
